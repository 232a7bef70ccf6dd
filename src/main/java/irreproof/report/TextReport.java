package irreproof.report;

import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.check.Severity;
import irreproof.check.Verdict;
import irreproof.text.LineIndex;
import irreproof.text.SourceText;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.util.List;
import java.util.Map;
import java.util.StringJoiner;

/**
 * Reports for people: each finding with its place, its line, its evidence and what to write instead; then what was
 * checked, and what was not and why. Lines and columns start at 1, columns count UTF-16 units.
 */
public final class TextReport {
    private static final String INDENT = "    ";
    private static final int MOST_REASONS = 4;

    private final StringBuilder text = new StringBuilder();

    private TextReport() {}

    /** The whole report, ending in a line end. */
    public static String print(List<FileReport> reports) {
        TextReport report = new TextReport();
        for (FileReport file : Reports.inOrder(reports)) {
            for (Finding finding : file.allFindings()) {
                report.finding(finding, file.source());
            }
        }
        report.summary(new Counts(reports));
        return report.text.toString();
    }

    private void finding(Finding finding, SourceText source) {
        LineIndex.Position start = source.lines().position(finding.span().start());
        text.append(source.path())
                .append(':')
                .append(start.line() + 1)
                .append(':')
                .append(start.column() + 1);
        text.append(": ").append(finding.severity().word()).append(": ").append(finding.message());
        text.append(" [").append(finding.rule()).append("]\n");
        text.append(Excerpt.print(source, finding.span(), INDENT));
        finding.evidence().forEach(line -> text.append(INDENT).append(line).append('\n'));
        finding.fixes().forEach(fix -> fix(fix, source));
        text.append('\n');
    }

    /** What the edited stretch should read, ready to paste; the fix's title if that is nothing. */
    private void fix(Fix fix, SourceText source) {
        List<String> lines = fixed(fix, source.content())
                .lines()
                .filter(line -> !line.isBlank())
                .map(String::strip)
                .toList();
        if (lines.isEmpty()) {
            text.append(INDENT).append(fix.title()).append('\n');
        } else if (lines.size() == 1) {
            text.append(INDENT).append("should read: ").append(lines.get(0)).append('\n');
        } else {
            text.append(INDENT).append("should read:\n");
            lines.forEach(
                    line -> text.append(INDENT).append(INDENT).append(line).append('\n'));
        }
    }

    private static String fixed(Fix fix, String content) {
        if (fix.edits().isEmpty()) {
            return "";
        }
        Span whole =
                fix.edits().stream().map(TextEdit::span).reduce(Span::cover).orElseThrow();
        List<TextEdit> shifted = fix.edits().stream()
                .map(edit -> new TextEdit(
                        new Span(
                                edit.span().start() - whole.start(), edit.span().end() - whole.start()),
                        edit.newText()))
                .toList();
        return TextEdit.apply(whole.of(content), shifted);
    }

    private void summary(Counts counts) {
        text.append(count(counts.files(), "file")).append(", ");
        int statements = counts.statements();
        text.append(count(statements, "statement"));
        if (statements > 0) {
            text.append(": ")
                    .append(counts.of(Verdict.HOLDS))
                    .append(counts.of(Verdict.HOLDS) == 1 ? " holds" : " hold");
            text.append(", ")
                    .append(counts.of(Verdict.FAILS))
                    .append(counts.of(Verdict.FAILS) == 1 ? " fails" : " fail");
            text.append(", ").append(counts.of(Verdict.UNDECIDED)).append(" undecided");
            if (counts.of(Verdict.UNDECIDED) > 0) {
                text.append(" (").append(reasons(counts)).append(')');
            }
        }
        text.append('\n');
        StringJoiner findings = new StringJoiner(", ", "", "\n");
        findings.setEmptyValue("");
        add(findings, counts.of(Severity.ERROR), "error");
        add(findings, counts.of(Severity.WARNING), "warning");
        int advice = counts.of(Severity.ADVICE);
        if (advice > 0) {
            findings.add(advice == 1 ? "1 piece of advice" : advice + " pieces of advice");
        }
        text.append(findings);
    }

    private static String reasons(Counts counts) {
        StringJoiner joined = new StringJoiner("; ");
        List<Map.Entry<String, Integer>> reasons = counts.reasons();
        int shown = reasons.size() <= MOST_REASONS ? reasons.size() : MOST_REASONS - 1;
        reasons.subList(0, shown).forEach(reason -> joined.add(reason.getKey() + ": " + reason.getValue()));
        int rest = reasons.subList(shown, reasons.size()).stream()
                .mapToInt(Map.Entry::getValue)
                .sum();
        if (rest > 0) {
            joined.add("other reasons: " + rest);
        }
        return joined.toString();
    }

    private static void add(StringJoiner joiner, int number, String noun) {
        if (number > 0) {
            joiner.add(count(number, noun));
        }
    }

    private static String count(int number, String noun) {
        return number + " " + noun + (number == 1 ? "" : "s");
    }
}
