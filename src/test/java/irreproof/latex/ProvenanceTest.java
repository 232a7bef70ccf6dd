package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.text.MarkedText;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Where expanded tokens come from. Under the source, each marked line gives the next run of tokens that share a place,
 * in the order the last passage holds them.
 */
final class ProvenanceTest {
    private static void provenance(String fixture) {
        MarkedText marked = MarkedText.of(fixture);
        LatexDocument document =
                Reader.read(new SourceText("x.tex", marked.text()), SourceProvider.none(), Budget.unlimited());
        Passage passage = document.passages().get(document.passages().size() - 1);
        List<MarkedText.Mark> found = new ArrayList<>();
        List<Token> run = new ArrayList<>();
        for (Row row : passage.rows()) {
            for (Cell cell : row.cells()) {
                for (Token token : cell.tokens()) {
                    if (token.kind() == TokenKind.SPACE) {
                        continue;
                    }
                    if (!run.isEmpty() && !run.get(0).span().equals(token.span())) {
                        found.add(mark(run));
                        run.clear();
                    }
                    run.add(token);
                }
            }
        }
        found.add(mark(run));
        assertEquals(show(marked.text(), marked.marks()), show(marked.text(), found));
    }

    private static MarkedText.Mark mark(List<Token> run) {
        return new MarkedText.Mark(run.get(0).span(), Manuscript.show(run));
    }

    private static String show(String text, List<MarkedText.Mark> marks) {
        StringBuilder shown = new StringBuilder();
        for (MarkedText.Mark mark : marks) {
            Span span = mark.span();
            shown.append(span)
                    .append(' ')
                    .append(span.of(text))
                    .append(" -> ")
                    .append(mark.label())
                    .append('\n');
        }
        return shown.toString();
    }

    @Test
    void plainTokensStandForThemselves() {
        provenance("""
                a $x_2$
                   ^ x
                    ^ _
                     ^ 2
                """);
    }

    @Test
    void aBodyStandsForTheCallAndAnArgumentForItself() {
        provenance("""
                \\newcommand{\\rep}[1]{\\mathbf{#1}}
                $1 \\rep{3}'$
                 ^ 1
                   ^^^^^^^ \\mathbf{
                        ^ 3
                   ^^^^^^^ }
                          ^ '
                """);
    }

    @Test
    void aMacroInABodyStandsForTheOutermostCall() {
        provenance("""
                \\newcommand{\\rep}[1]{\\mathbf{#1}}\\newcommand{\\five}{\\rep{5}}
                \\newcommand{\\barred}[1]{\\bar{\\rep{#1}}}
                $\\five\\barred 5$
                 ^^^^^ \\mathbf{5}
                      ^^^^^^^^^ \\bar{\\mathbf{
                              ^ 5
                      ^^^^^^^^^ }}
                """);
    }

    @Test
    void aMacroInAnArgumentStandsForItsOwnCall() {
        provenance("""
                \\newcommand{\\rep}[2][]{\\mathbf{#2}_{#1}}\\def\\ten{10}
                $\\rep[s]{\\ten}$
                 ^^^^^^^^^^^^^ \\mathbf{
                         ^^^^ 10
                 ^^^^^^^^^^^^^ }_{
                      ^ s
                 ^^^^^^^^^^^^^ }
                """);
    }

    @Test
    void aMacroThatTakesItsArgumentFromBehindTheCall() {
        provenance("""
                \\newcommand{\\rep}[1]{\\mathbf{#1}}\\newcommand{\\R}{\\rep}
                $\\R{3}$
                 ^^^^^ \\mathbf{
                    ^ 3
                 ^^^^^ }
                """);
    }

    @Test
    void delimitersFromMacrosAndEnvironments() {
        provenance("""
                \\newenvironment{rule}[1]{\\begin{equation}#1=}{\\end{equation}}
                \\begin{rule}{8} 1 \\end{rule}
                             ^ 8
                ^^^^^^^^^^^^^^^ =
                                ^ 1
                """);
    }

    @Test
    void aWholeFormulaInAMacro() {
        String text = "\\newcommand{\\eq}[1]{\\begin{equation}#1\\end{equation}}\nso \\eq{3 \\otimes 3} and";
        Passage passage = Manuscript.of(text).document().passages().get(0);
        assertEquals("\\eq{3 \\otimes 3}", passage.span().of(text));
        assertEquals("3 \\otimes 3", passage.rows().get(0).cells().get(0).span().of(text));
    }
}
