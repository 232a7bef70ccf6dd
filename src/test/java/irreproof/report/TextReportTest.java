package irreproof.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.check.Severity;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.util.List;
import org.junit.jupiter.api.Test;

class TextReportTest {
    private static final String PAPER = """
            paper/main.tex:1:14: warning: this directive cannot be read [unreadable-directive]
                % irreproof: grup SU(3)
                             ^~~~~~~~~~
                should read: group

            paper/main.tex:2:28: error: 6 and 3 are not what 3 times 3 is: missing \\bar 3, surplus 3 [wrong-summand]
                In SU(3), é $3 \\otimes 3 = 6 \\oplus 3$,
                                           ^~~~~~~~~~
                N-ality: the left side has 2, the summand 3 has 1
                should read: 6 \\oplus \\bar 3

            2 files, 3 statements: 1 holds, 1 fails, 1 undecided (no group named: 1)
            1 error, 1 warning
            """;

    @Test
    void tellsEverythingAboutAPaper() {
        assertEquals(PAPER, TextReport.print(List.of(SampleReports.paper(), SampleReports.empty("a.tex"))));
    }

    @Test
    void printsFilesInTheOrderOfTheirPaths() {
        List<String> printed = TextReport.print(List.of(
                        SampleReports.paper(), SampleReports.finding("x", advice(new Span(0, 1), List.of()))))
                .lines()
                .filter(line -> line.endsWith("]"))
                .map(line -> line.substring(0, line.indexOf(':')))
                .toList();
        assertEquals(List.of("a.tex", "paper/main.tex", "paper/main.tex"), printed);
    }

    @Test
    void countsInWords() {
        assertEquals("0 files, 0 statements\n", TextReport.print(List.of()));
        assertEquals(
                "1 file, 1 statement: 0 hold, 0 fail, 1 undecided (r: 1)\n",
                TextReport.print(List.of(SampleReports.undecided("a", "r"))));
    }

    @Test
    void tellsTheMostFrequentReasonsFirstAndSumsUpTheRest() {
        assertEquals(
                "1 file, 4 statements: 0 hold, 0 fail, 4 undecided (c: 1; d: 1; e: 1; f: 1)\n",
                TextReport.print(List.of(SampleReports.undecided("a", "f", "e", "d", "c"))));
        assertEquals(
                "2 files, 7 statements: 0 hold, 0 fail, 7 undecided (d: 2; f: 2; b: 1; other reasons: 2)\n",
                TextReport.print(List.of(
                        SampleReports.undecided("a", "f", "e", "d", "c"),
                        SampleReports.undecided("b", "d", "b", "f"))));
    }

    @Test
    void marksOneCharacterWhereTheSpanIsEmpty() {
        assertExcerpt("    ab\n      ^\n", "ab\n", new Span(2, 2));
        assertExcerpt("    ab\n    ^\n", "ab\n", new Span(0, 0));
    }

    @Test
    void marksTheFirstLineOfALongSpanToItsEnd() {
        assertExcerpt("    a bcd\n      ^~~\n", "a bcd\nefg", new Span(2, 8));
        assertExcerpt("    a bcd\n      ^~~\n", "a bcd\r\nefg", new Span(2, 8));
    }

    @Test
    void keepsTabsSoThatTheMarksLineUp() {
        assertExcerpt("    \ta\tb\n    \t \t^\n", "\ta\tb", new Span(3, 4));
    }

    @Test
    void countsCharactersNotUtf16Units() {
        assertExcerpt("    \ud835\udd30 = b\n        ^\n", "\ud835\udd30 = b", new Span(5, 6));
    }

    @Test
    void letsNoControlCharacterMoveTheCursor() {
        assertExcerpt("    a [31m b\n           ^\n", "a\u001b[31m\u0007b", new Span(7, 8));
    }

    @Test
    void showsTheNeighbourhoodInALongLine() {
        String line = "a".repeat(100) + "XYZ" + "b".repeat(100);
        assertExcerpt(
                "    …" + "a".repeat(30) + "XYZ" + "b".repeat(77) + "…\n" + " ".repeat(35) + "^~~\n",
                line,
                new Span(100, 103));
        assertExcerpt(
                "    …" + "a".repeat(7) + "XYZ" + "b".repeat(100) + "\n" + " ".repeat(112) + "^~~\n",
                line,
                new Span(200, 203));
    }

    @Test
    void showsWhatTheEditedStretchWillRead() {
        Fix both = new Fix(
                "bar both", false, List.of(new TextEdit(new Span(0, 1), "c"), new TextEdit(new Span(2, 3), "d")));
        assertFix("    should read: c+d\n", "a+b", both);
        assertFix("    take it out\n", "a+b", new Fix("take it out", true, List.of(new TextEdit(new Span(0, 3), ""))));
        assertFix(
                "    should read:\n        c\n        d\n",
                "a+b",
                new Fix("put it on two lines", true, List.of(new TextEdit(new Span(0, 3), "  c\n  d"))));
        assertFix("    think again\n", "a+b", new Fix("think again", false, List.of()));
    }

    private static Finding advice(Span span, List<Fix> fixes) {
        return new Finding("rule", Severity.ADVICE, span, "message", List.of(), fixes);
    }

    private static void assertExcerpt(String expected, String content, Span span) {
        assertFinding(expected, content, advice(span, List.of()));
    }

    private static void assertFix(String expected, String content, Fix fix) {
        assertFinding("    " + content + "\n    ^\n" + expected, content, advice(new Span(0, 1), List.of(fix)));
    }

    /** The lines between the first, which names the place, and the blank one before the summary. */
    private static void assertFinding(String expected, String content, Finding finding) {
        String printed = TextReport.print(List.of(SampleReports.finding(content, finding)));
        String body = printed.substring(printed.indexOf("[rule]\n") + 7, printed.indexOf("\n1 file, 0 statements\n"));
        assertEquals(expected, body);
    }
}
