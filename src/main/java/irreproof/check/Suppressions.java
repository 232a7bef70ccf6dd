package irreproof.check;

import irreproof.text.Span;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Applies the directives {@code allow RULE}: each covers the statement that follows it. */
final class Suppressions {
    static final String UNREADABLE = "unreadable-directive";
    static final String UNUSED = "unused-allow";

    private final List<Directive.Allow> allows = new ArrayList<>();
    private final Set<Directive.Allow> used = new HashSet<>();
    private final List<Span> statements;

    /** @param statements the spans of all statements, in document order */
    Suppressions(Directives directives, List<Span> statements) {
        this.statements = statements;
        for (Directive directive : directives.all()) {
            if (directive instanceof Directive.Allow allow) {
                allows.add(allow);
            }
        }
    }

    /** The findings of one statement that no directive allows. */
    List<Finding> filter(Span statement, List<Finding> findings) {
        List<Finding> kept = new ArrayList<>(findings);
        for (Directive.Allow allow : allows) {
            if (covers(allow, statement)
                    && kept.removeIf(finding -> finding.rule().equals(allow.rule()))) {
                used.add(allow);
            }
        }
        return kept;
    }

    private boolean covers(Directive.Allow allow, Span statement) {
        return statements.stream()
                .filter(span -> span.end() > allow.span().start())
                .findFirst()
                .filter(statement::equals)
                .isPresent();
    }

    /** Findings on the directives themselves: those that cannot be read, and those that suppressed nothing. */
    List<Finding> findings(Directives directives) {
        List<Finding> findings = new ArrayList<>();
        for (Directive directive : directives.all()) {
            if (directive instanceof Directive.Unreadable unreadable) {
                findings.add(
                        warning(UNREADABLE, directive.span(), "cannot read this directive: " + unreadable.problem()));
            } else if (directive instanceof Directive.Allow allow && !used.contains(allow)) {
                findings.add(warning(UNUSED, directive.span(), "the next statement does not break " + allow.rule()));
            }
        }
        return findings;
    }

    private static Finding warning(String rule, Span place, String message) {
        return new Finding(rule, Severity.WARNING, place, message, List.of(), List.of());
    }
}
