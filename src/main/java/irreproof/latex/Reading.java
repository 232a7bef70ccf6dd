package irreproof.latex;

import irreproof.budget.Budget;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** What all files read for one document have in common: definitions, problems, budget, and how much may be expanded. */
final class Reading {
    private static final int MOST_PROBLEMS = 100;
    /** What an expansion costs beside its tokens, so that empty ones come to an end too. */
    private static final int COST_OF_EXPANSION = 4;

    private final MacroTable macros = new MacroTable();
    private final Set<String> problems = new LinkedHashSet<>();
    private final Budget budget;
    private long expansionLeft = 20_000_000;

    Reading(Budget budget) {
        this.budget = budget;
    }

    MacroTable macros() {
        return macros;
    }

    Budget budget() {
        return budget;
    }

    void report(String problem) {
        if (problems.size() < MOST_PROBLEMS) {
            problems.add(problem);
        }
    }

    List<String> problems() {
        return List.copyOf(problems);
    }

    /** Counts an expansion that gave so many tokens. */
    void expanded(int tokens) {
        expansionLeft -= tokens + COST_OF_EXPANSION;
        budget.spend(tokens);
    }

    /** True once the macros of the document have given more tokens than any manuscript needs. */
    boolean isExhausted() {
        return expansionLeft < 0;
    }
}
