package irreproof.report;

import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.check.SettingSource;
import irreproof.check.Severity;
import irreproof.check.StatementKind;
import irreproof.check.StatementReport;
import irreproof.check.Verdict;
import irreproof.notation.Statement;
import irreproof.text.SourceText;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.util.Arrays;
import java.util.List;

/** Reports built by hand, as {@code check} could have made them. */
final class SampleReports {
    private static final String WRONG = "3 \\otimes 3 = 6 \\oplus 3";
    private static final String HOLDS = "3 \\otimes \\bar 3 = 1 \\oplus 8";
    private static final String UNKNOWN = "4 \\otimes 4 = 16";

    private SampleReports() {}

    /** One statement of each verdict, and a directive that cannot be read. */
    static FileReport paper() {
        SourceText source = new SourceText("paper/main.tex", """
                %% irreproof: grup SU(3)
                In SU(3), é $%s$,
                $%s$.

                $%s$
                """.formatted(WRONG, HOLDS, UNKNOWN));
        Span side = find(source, "6 \\oplus 3");
        Finding mismatch = new Finding(
                "wrong-summand",
                Severity.ERROR,
                side,
                "6 and 3 are not what 3 times 3 is: missing \\bar 3, surplus 3",
                List.of("N-ality: the left side has 2, the summand 3 has 1"),
                List.of(new Fix("replace the right side by", false, List.of(new TextEdit(side, "6 \\oplus \\bar 3")))));
        Finding directive = new Finding(
                "unreadable-directive",
                Severity.WARNING,
                find(source, "grup SU(3)"),
                "this directive cannot be read",
                List.of(),
                List.of(new Fix("write", true, List.of(new TextEdit(find(source, "grup"), "group")))));
        return new FileReport(
                source,
                List.of(
                        statement(source, WRONG, "SU(3)", SettingSource.PROSE, Verdict.FAILS, "", List.of(mismatch)),
                        statement(source, HOLDS, "SU(3)", SettingSource.PROSE, Verdict.HOLDS, "", List.of()),
                        statement(
                                source,
                                UNKNOWN,
                                "",
                                SettingSource.NONE,
                                Verdict.UNDECIDED,
                                "no group named",
                                List.of())),
                List.of(directive));
    }

    static FileReport empty(String path) {
        return new FileReport(new SourceText(path, ""), List.of(), List.of());
    }

    /** A file whose statements are undecided for these reasons. */
    static FileReport undecided(String path, String... reasons) {
        SourceText source = new SourceText(path, UNKNOWN);
        return new FileReport(
                source,
                Arrays.stream(reasons)
                        .map(reason -> statement(
                                source, UNKNOWN, "", SettingSource.NONE, Verdict.UNDECIDED, reason, List.of()))
                        .toList(),
                List.of());
    }

    static FileReport finding(String content, Finding finding) {
        return new FileReport(new SourceText("a.tex", content), List.of(), List.of(finding));
    }

    static Finding advice(int start, int end) {
        return new Finding("rule", Severity.ADVICE, new Span(start, end), "message", List.of(), List.of());
    }

    private static Span find(SourceText source, String words) {
        int start = source.content().indexOf(words);
        return new Span(start, start + words.length());
    }

    private static StatementReport statement(
            SourceText source,
            String latex,
            String setting,
            SettingSource settingSource,
            Verdict verdict,
            String reason,
            List<Finding> findings) {
        Statement statement = new Statement(List.of(), List.of(), find(source, latex), latex, false, List.of());
        return new StatementReport(
                statement, StatementKind.PRODUCT, setting, settingSource, null, verdict, reason, findings, List.of());
    }
}
