package irreproof.corpus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.Golden;
import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.Checker;
import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Severity;
import irreproof.check.StatementReport;
import irreproof.check.Verdict;
import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/**
 * The statements that were seen in real manuscripts, each set in a small document that names its group, against the
 * truth an informed reader gave them (src/test/resources/corpus/seen.jsonl). Prints the scoreboard and holds the bars:
 * no error or warning on a statement that is true, partial or unsure; no false statement holds; of the products about
 * one simple Lie group at least 80 % are decided as labelled.
 */
class CorpusScoreboardTest {
    private static final CheckOptions OPTIONS =
            new CheckOptions("", SourceProvider.none(), CheckOptions.DEFAULT_STEPS, false);

    private record Outcome(SeenStatement seen, FileReport report) {
        List<Finding> alarms() {
            return report.allFindings().stream()
                    .filter(finding -> finding.severity() != Severity.ADVICE)
                    .toList();
        }

        /** One verdict for all that was found of the statement: a failure counts most, then what is undecided. */
        Verdict verdict() {
            List<Verdict> verdicts =
                    report.statements().stream().map(StatementReport::verdict).toList();
            if (verdicts.contains(Verdict.FAILS)) {
                return Verdict.FAILS;
            }
            boolean undecided = verdicts.isEmpty() || verdicts.contains(Verdict.UNDECIDED);
            return undecided ? Verdict.UNDECIDED : Verdict.HOLDS;
        }

        boolean asLabelled() {
            return switch (seen.truth()) {
                case "true" -> verdict() == Verdict.HOLDS;
                case "false" -> verdict() == Verdict.FAILS;
                default -> false;
            };
        }

        String line() {
            String rules = alarmsAndAdvice();
            String reasons = report.statements().stream()
                    .map(StatementReport::reason)
                    .filter(reason -> !reason.isEmpty())
                    .distinct()
                    .collect(Collectors.joining("; "));
            String nothing = report.statements().isEmpty() ? "no statement found" : "";
            return String.join(
                    " | ",
                    List.of(
                            seen.id(),
                            seen.kind(),
                            seen.group(),
                            seen.truth(),
                            verdict().word(),
                            rules,
                            reasons + nothing));
        }

        private String alarmsAndAdvice() {
            return report.allFindings().stream()
                    .map(finding -> finding.severity().word() + " " + finding.rule())
                    .distinct()
                    .collect(Collectors.joining(", "));
        }
    }

    @Test
    void decidesTheCorpusAsLabelled() {
        List<Outcome> outcomes = SeenStatement.all().stream()
                .map(seen -> new Outcome(seen, check(seen)))
                .toList();
        List<Outcome> simple = outcomes.stream()
                .filter(outcome -> outcome.seen().isProductOfSimpleGroup())
                .filter(outcome -> outcome.seen().hasTruth())
                .toList();
        long decided = simple.stream().filter(Outcome::asLabelled).count();
        String score = "products about one simple Lie group: " + decided + " of " + simple.size()
                + " decided as labelled (" + 100 * decided / simple.size() + " %)";
        System.out.println("corpus: " + score);
        Golden.assertMatches("corpus/scoreboard.txt", text(score, outcomes));

        List<String> falseAlarms = outcomes.stream()
                .filter(outcome -> !outcome.seen().truth().equals("false"))
                .filter(outcome -> !outcome.alarms().isEmpty())
                .map(Outcome::line)
                .toList();
        assertEquals(List.of(), falseAlarms, "errors or warnings on statements that are not false");
        List<String> wronglyHeld = outcomes.stream()
                .filter(outcome -> outcome.seen().truth().equals("false"))
                .filter(outcome -> outcome.verdict() == Verdict.HOLDS)
                .map(Outcome::line)
                .toList();
        assertEquals(List.of(), wronglyHeld, "false statements that are said to hold");
        assertTrue(100 * decided >= 80L * simple.size(), score);
    }

    private static FileReport check(SeenStatement seen) {
        SourceText source = new SourceText(seen.id() + ".tex", seen.document());
        return Checker.check(source, OPTIONS, Budget.unlimited());
    }

    /** The score, then every statement: those not decided as labelled first, grouped by kind. */
    private static String text(String score, List<Outcome> outcomes) {
        StringBuilder text = new StringBuilder(score).append('\n');
        Map<String, List<Outcome>> open = new TreeMap<>();
        List<Outcome> settled = new ArrayList<>();
        for (Outcome outcome : outcomes) {
            if (outcome.asLabelled()) {
                settled.add(outcome);
            } else {
                open.computeIfAbsent(outcome.seen().kind(), kind -> new ArrayList<>())
                        .add(outcome);
            }
        }
        text.append("\n# Not decided as labelled: id | kind | group | truth | verdict | findings | reason\n");
        open.forEach((kind, list) -> {
            text.append("\n## ").append(kind).append(" (").append(list.size()).append(")\n");
            list.forEach(outcome -> text.append(outcome.line()).append('\n'));
        });
        text.append("\n# Decided as labelled (").append(settled.size()).append(")\n\n");
        settled.forEach(outcome -> text.append(outcome.line()).append('\n'));
        return text.toString();
    }
}
