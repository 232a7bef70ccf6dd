package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

/** What counts as a passage, and how it falls into rows and cells. Cases from common practice. */
final class PassageTest {
    private static void passages(String text, String... expected) {
        assertEquals(List.of(expected), Manuscript.of(text).passages());
    }

    @Test
    void inlineAndDisplay() {
        passages("a $3\\otimes\\bar 3$, \\(8\\), \\[ 1 \\] and $$ 10 $$.", "3\\otimes\\bar3", "8", "1", "10");
    }

    @Test
    void rowsAndCells() {
        passages(
                "\\begin{align*} a &= b \\\\[2pt] c &= d \\nonumber \\\\ \\end{align*}",
                "a & = b // c & = d \\nonumber");
        passages("\\begin{eqnarray} a &=& b \\\\* c &=& d\\end{eqnarray}", "a & = & b // c & = & d");
    }

    @Test
    void aLoneInnerEnvironmentMakesTheRows() {
        passages(
                "\\begin{equation}\\label{eq:x}\\begin{split} a &= b \\\\ &= c\\end{split}.\\end{equation}",
                "\\label{eq:x} a & = b //  & = c.");
        passages("\\[ \\begin{array}{rcl} a &=& b \\\\ c &=& d \\end{array} \\]", "a & = & b // c & = & d");
    }

    @Test
    void innerEnvironmentsBesideOtherThingsStayWhole() {
        passages(
                "\\[ x = \\begin{pmatrix} 1 & 0 \\\\ 0 & 1 \\end{pmatrix} \\\\ y \\]",
                "x = \\begin{pmatrix} 1 & 0 \\\\ 0 & 1 \\end{pmatrix} // y");
    }

    @Test
    void tablesHoldOnlyTheirMathematics() {
        passages(
                "\\begin{tabular}{l|c} \\hline Product & $3\\otimes3$ \\\\ \\multicolumn{2}{c}{sum $6\\oplus\\bar3$}"
                        + " \\\\ \\end{tabular}",
                " & 3\\otimes3 // 6\\oplus\\bar3");
    }

    @Test
    void userDelimiters() {
        passages(
                "\\newcommand{\\beq}{\\begin{equation}}\\def\\eeq{\\end{equation}}\n\\beq 3\\otimes 3 \\eeq",
                "3\\otimes3");
        passages(
                "\\newenvironment{rules}[1]{\\begin{align}#1 &}{\\end{align}}\\begin{rules}{a} b\\end{rules}", "a & b");
    }

    @Test
    void missingDollarCostsOnePassage() {
        passages("One $3 \\otimes 3 here.\n\nTwo $8$.", "3 \\otimes3 here.", "8");
        passages("\\[ 3 \\otimes 3 \\begin{equation} 8 \\end{equation}", "3 \\otimes3", "8");
    }

    @Test
    void whatCannotStandInAFormulaEndsIt() {
        passages("$3 \\text{if\n\n$8$", "3 \\text{if", "8");
        passages("\\footnote{on $3} and $8$", "3", "8");
        passages("\\begin{theorem} $3 \\end{theorem} $8$", "3", "8");
        passages("\\begin{itemize}\\item $3 \\item $8$\\end{itemize}", "3", "8");
        passages("\\begin{align} 3 \\section{On $8$}", "3", "8");
        passages("$3}$ $8$", "3", "8");
        passages("$a$$b$", "a", "b");
    }

    @Test
    void tablesKeepTheirFormulasInTheirCells() {
        passages("\\begin{tabular}{c} $3 & of $8$ \\\\ \\ensuremath{10} & x\\end{tabular}", "3 & 8 // 10 & ");
        passages(
                "\\begin{tabular}{l>{\\small$}c<{$}*{2}{|>{$}p{1cm}<{$}|}c}\\hline a & 3 & 8\\times8 & $1$ & x \\\\ \\hline & &"
                        + " \\multicolumn{2}{c}{b} \\end{tabular}",
                " & 3 & 8\\times8 & 1 & ");
        passages("\\begin{tabular}{c} $8$ \n\n x \\section{On $3$}", "8", "3");
    }

    @Test
    void textInFormulasMayHoldFormulas() {
        passages("\\[ 3 \\text{ for $x$ or \\mbox{$y$}} 8 \\]", "3 \\text{ for x or \\mbox{y}} 8");
        passages("$3\\raisebox{1ex}{ $x$ }8$", "3\\raisebox{1ex}{ x }8");
    }

    @Test
    void intertextSplitsRows() {
        passages("\\begin{align} a&=b \\intertext{and $x$} c&=d \\end{align}", "a & =b // c & =d");
    }

    @Test
    void commentsDefinitionsAndTheEndHoldNoPassages() {
        passages(
                "\\documentclass{article}\\newcommand{\\x}{$1$}\n$2$\\begin{document}\n% $3$\n\\newcommand\\y{$4$}$5$"
                        + "\\verb|$6$|\\begin{verbatim}$7$\\end{verbatim}\\end{document} $8$",
                "5");
    }

    @Test
    void mathematicsInHeadingsAndFootnotes() {
        passages("\\section{The $8$}\\footnote{of $3$}\\begin{figure}[h]\\caption{$10$}\\end{figure}", "8", "3", "10");
    }

    @Test
    void aSnippetIsOnePassage() {
        assertEquals(
                "\\mathbf{8}\\otimes\\mathbf{8}",
                Manuscript.show(Reader.passage("\\mathbf{8}\\otimes\\mathbf{8}").orElseThrow()));
        assertEquals("3", Manuscript.show(Reader.passage(" $3$ ").orElseThrow()));
    }
}
