package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.latex.SourceProvider;
import irreproof.text.LineIndex;
import irreproof.text.SourceText;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * Source text with the expected findings marked below it: a line of carets with a rule's name says that exactly these
 * characters of the line above bear a finding of this rule. Marks and findings are matched one to one.
 */
final class Fixture {
    private static final Pattern MARK = Pattern.compile("^( *)(\\^+) ([a-z-]+)$");

    private Fixture() {}

    /** Checks the marked text; returns the report for further questions. */
    static FileReport checks(String marked) {
        return checks(marked, "");
    }

    static FileReport checks(String marked, String defaultGroup) {
        List<String> source = new ArrayList<>();
        List<String> expected = new ArrayList<>();
        for (String line : marked.lines().toList()) {
            Matcher mark = MARK.matcher(line);
            if (mark.matches()) {
                expected.add(describe(source.size() - 1, mark.start(2), mark.end(2), mark.group(3)));
            } else {
                source.add(line);
            }
        }
        FileReport report = report(String.join("\n", source) + "\n", defaultGroup);
        LineIndex lines = report.source().lines();
        List<String> found = report.allFindings().stream()
                .map(finding -> {
                    LineIndex.Position start = lines.position(finding.span().start());
                    LineIndex.Position end = lines.position(finding.span().end());
                    return describe(start.line(), start.column(), end.column(), finding.rule());
                })
                .toList();
        assertEquals(sorted(expected), sorted(found), () -> messages(report));
        return report;
    }

    /** The report on a text without marks. */
    static FileReport report(String source, String defaultGroup) {
        return report(source, defaultGroup, Map.of());
    }

    static FileReport report(String source, String defaultGroup, Map<String, String> files) {
        SourceProvider provider = (from, name) -> Optional.ofNullable(files.get(name))
                .or(() -> Optional.ofNullable(files.get(name + ".tex")))
                .map(content -> new SourceText(name, content));
        CheckOptions options = new CheckOptions(defaultGroup, provider, CheckOptions.DEFAULT_STEPS, true);
        return Checker.check(new SourceText("fixture.tex", source), options, Budget.unlimited());
    }

    /** The only statement of the text in the group. */
    static StatementReport only(String group, String latex) {
        FileReport report = report("\\[ " + latex + " \\]\n", group);
        assertEquals(1, report.statements().size(), () -> "statements in " + latex);
        return report.statements().get(0);
    }

    private static String describe(int line, int start, int end, String rule) {
        return "line " + (line + 1) + ", columns " + start + " to " + end + ": " + rule;
    }

    private static List<String> sorted(List<String> list) {
        return list.stream().sorted().toList();
    }

    private static String messages(FileReport report) {
        return report.allFindings().stream()
                        .map(finding -> finding.rule() + ": " + finding.message())
                        .collect(Collectors.joining("\n"))
                + report.statements().stream()
                        .map(statement -> "\n" + statement.statement().latex() + ": " + statement.verdict() + " "
                                + statement.reason())
                        .collect(Collectors.joining());
    }
}
