package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The reader takes whatever it is given: cut off, scrambled, nested without end, expanding without end. */
final class RobustnessTest {
    private static final Duration LIMIT = Duration.ofSeconds(60);
    private static final String REALISTIC = """
            \\documentclass[12pt]{article}
            \\usepackage{amsmath,mystyle}
            \\newcommand{\\rep}[1]{\\mathbf{#1}}
            \\renewcommand*{\\v}[2][8]{\\boldsymbol{#1_{#2}}}
            \\def\\beqa#1.{\\begin{align}#1} \\def\\eeqa{\\end{align}}
            \\NewDocumentCommand{\\irrep}{s O{3} m}{\\mathbf{#2}_{#3}}
            \\DeclareMathOperator*{\\Sym}{Sym}
            \\newenvironment{rules}[1][x]{\\begin{equation}\\begin{split}#1}{\\end{split}\\end{equation}}
            \\begin{document}
            \\title{On $SU(3)$}\\section*{The \\emph{group} $\\mathrm{SU}(3)$} % irreproof: group SU(3)
            Under \\verb|$x$| the~rule $\\rep{3}\\otimes\\bar{\\rep 3} = \\v{s} \\oplus \\irrep*[1]{a}$, see \\url{a%b_c}.

            \\beqa a &= b \\intertext{then} . \\\\[2pt] c &= \\begin{pmatrix} 1 & 0 \\\\ 0 & 1 \\end{pmatrix} \\eeqa
            \\begin{rules}[y] 8 &= 8 \\\\ &= \\ydiagram{2,1} \\end{rules} \\iffalse $1$ \\else $2$ \\fi
            \\begin{tabular}{l|r} $3$ & \\multicolumn{2}{c}{$\\bar 3$} \\\\ \\hline \\end{tabular} \\( 1 \\) $$ 2 $$ \\[ 3 \\]
            \\begin{verbatim} $ \\end{verbatim} {\\let\\old\\bar \\renewcommand\\bar[1]{\\old{#1}} $\\bar{3}$}
            \\end{document} trailing
            """;

    private static LatexDocument read(String text) {
        SourceProvider sources = (from, name) -> Optional.empty();
        LatexDocument document = Reader.read(new SourceText("x.tex", text), sources, Budget.unlimited());
        for (Passage passage : document.passages()) {
            assertInside(passage.span(), text);
            for (Row row : passage.rows()) {
                assertFalse(row.cells().isEmpty());
                row.cells().forEach(cell -> {
                    assertInside(cell.span(), text);
                    cell.tokens().forEach(token -> assertInside(token.span(), text));
                });
            }
        }
        return document;
    }

    private static void assertInside(Span span, String text) {
        assertTrue(span.end() <= text.length(), () -> span + " in a text of " + text.length());
    }

    @Test
    void everyBeginningOfADocument() {
        assertTimeoutPreemptively(LIMIT, () -> {
            for (int end = 0; end <= REALISTIC.length(); end++) {
                read(REALISTIC.substring(0, end));
                read(REALISTIC.substring(end));
            }
        });
    }

    @Test
    void soup() {
        long seed = 20261201;
        System.out.println("soup seed " + seed);
        Random random = new Random(seed);
        String[] pieces = {
            "{",
            "}",
            "$",
            "$$",
            "\\[",
            "\\]",
            "\\(",
            "\\)",
            "&",
            "\\\\",
            "^",
            "_",
            "#1",
            "#",
            "%",
            "\n",
            "\n\n",
            "\\begin",
            "\\end",
            "{align}",
            "{split}",
            "{tabular}",
            "{verbatim}",
            "\\newcommand",
            "\\def",
            "\\let",
            "\\x",
            "\\y",
            "[",
            "]",
            "\\iffalse",
            "\\else",
            "\\fi",
            "\\section",
            "3",
            "\\otimes",
            " ",
            "*",
            "\\intertext",
            "\\text",
            "\\input",
            "\\newenvironment",
            "{x}",
            "\\NewDocumentCommand",
            "\\ensuremath",
            "\\verb|",
            "\\url{",
            "\\",
            "~",
            "é",
            "𝟛"
        };
        assertTimeoutPreemptively(LIMIT, () -> {
            for (int round = 0; round < 3000; round++) {
                StringBuilder text = new StringBuilder();
                for (int i = random.nextInt(60); i >= 0; i--) {
                    text.append(pieces[random.nextInt(pieces.length)]);
                }
                read(text.toString());
            }
        });
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{",
                "}",
                "$",
                "$x$",
                "\\[",
                "&",
                "\\begin{split}",
                "\\begin{align}",
                "\\end{align}",
                "$\\begin{split}",
                "$\\text{",
                "_{",
                "\\rep{",
                "\\rep[",
                "\\section{",
                "\\iffalse ",
                "\\newcommand{\\x}",
                "\\footnote{$",
                "$a\n\n",
                "\\begin{tabular}{l}",
                "\\multicolumn{2}{c}{",
                "\\x ",
                "\\begin{e}",
                "\\cite[",
                "\\verb|",
                "\\url{",
                "\\gdef\\x{}{",
                "\\csname a",
                "\\ifx",
                "\\@ifstar{"
            })
    void deepOrLong(String piece) {
        String head = "\\newcommand{\\rep}[2][]{#1#2}\\newenvironment{e}{\\begin{align}}{\\end{align}}";
        assertTimeoutPreemptively(LIMIT, () -> {
            read(head + piece.repeat(20_000));
            read(head + "\\begin{align}" + piece.repeat(20_000));
        });
    }

    @Test
    void manyOpenBraces() {
        assertTimeoutPreemptively(LIMIT, () -> {
            read("{".repeat(100_000));
            read("$" + "{".repeat(100_000));
            read("\\[" + "\\begin{split}".repeat(100_000));
        });
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "\\def\\x{\\x}",
                "\\def\\x{\\x a}",
                "\\def\\x{a\\x}",
                "\\def\\x{\\x\\x}",
                "\\def\\y#1{\\y{#1#1}}\\def\\x{\\y a}",
                "\\newcommand\\y[1][]{\\y}\\let\\x\\y",
                "\\def\\x{\\y\\y}\\def\\y{\\x\\x}",
                "\\newenvironment{e}{\\begin{e}}{\\end{e}}\\def\\x{\\begin{e}}",
                "\\edef\\x{\\x\\ensuremath{\\x}}"
            })
    void bombs(String definition) {
        assertTimeoutPreemptively(LIMIT, () -> {
            LatexDocument document = read(definition + "\n$1$\n\n$\\x$\n\n\\x\n\n$\\text{\\x}$\n\n$2$");
            assertFalse(document.problems().isEmpty());
            List<String> shown =
                    document.passages().stream().map(Manuscript::show).toList();
            assertEquals("1", shown.get(0));
            assertEquals("2", shown.get(shown.size() - 1));
        });
    }

    @Test
    void aBudgetThatIsTooSmallIsReported() {
        SourceText source = new SourceText("x.tex", REALISTIC);
        assertThrows(BudgetExceeded.class, () -> Reader.read(source, SourceProvider.none(), Budget.of(100)));
    }

    @Test
    void lineEndsMakeNoDifference() {
        LatexDocument unix = read(REALISTIC);
        for (String end : List.of("\r\n", "\r")) {
            LatexDocument other = read(REALISTIC.replace("\n", end));
            assertEquals(
                    unix.passages().stream().map(Manuscript::show).toList(),
                    other.passages().stream().map(Manuscript::show).toList());
            assertEquals(unix.prose().text(), other.prose().text());
            assertEquals(
                    unix.comments().stream().map(Comment::text).toList(),
                    other.comments().stream().map(Comment::text).toList());
            assertEquals(unix.paragraphs().size(), other.paragraphs().size());
        }
        assertEquals(11, unix.passages().size());
    }
}
