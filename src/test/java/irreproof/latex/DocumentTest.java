package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.text.MarkedText;
import irreproof.text.Span;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Headings, paragraphs and comments; the fixtures mark where they stand. */
final class DocumentTest {
    private static List<Span> marks(MarkedText marked) {
        return marked.marks().stream().map(MarkedText.Mark::span).toList();
    }

    @Test
    void headings() {
        MarkedText marked = MarkedText.of("""
                \\title{On $8$}
                ^^^^^^^^^^^^^^ 0
                \\part{A} \\section*{B}
                ^^^^^^^^ 1
                         ^^^^^^^^^^^^ 2
                \\subsection[short]{long} text
                ^^^^^^^^^^^^^^^^^^^^^^^^ 3
                % \\section{none}
                """);
        List<Heading> headings = Manuscript.of(marked.text()).document().headings();
        assertEquals(marks(marked), headings.stream().map(Heading::span).toList());
        assertEquals(
                marked.marks().stream()
                        .map(mark -> Integer.valueOf(mark.label()))
                        .toList(),
                headings.stream().map(Heading::level).toList());
    }

    @Test
    void paragraphs() {
        MarkedText marked = MarkedText.of("""
                Under $3$ it.
                ^^^^^^^^^^^^^

                % nothing

                One \\[ 8 \\] two.\\par Three
                ^^^^^^^^^^^^^^^^
                                     ^^^^^
                \\section{Four} five
                               ^^^^
                """);
        assertEquals(marks(marked), Manuscript.of(marked.text()).document().paragraphs());
    }

    @Test
    void comments() {
        MarkedText marked = MarkedText.of("""
                % irreproof: group SU(3)
                ^^^^^^^^^^^^^^^^^^^^^^^^
                \\newcommand{\\x}{8 % in a definition
                                  ^^^^^^^^^^^^^^^^^
                } $8 % in a formula
                     ^^^^^^^^^^^^^^
                $ 10\\% \\verb|%| \\begin{verbatim} % \\end{verbatim} %
                                                                  ^
                """);
        List<Comment> comments = Manuscript.of(marked.text()).document().comments();
        assertEquals(marks(marked), comments.stream().map(Comment::span).toList());
        assertEquals(" irreproof: group SU(3)", comments.get(0).text());
    }

    @Test
    void aPreambleIsNotProse() {
        Manuscript manuscript = Manuscript.of("\\documentclass{x} junk $1$ \\title{On $SU(3)$}\n\n\\begin{document}a");
        assertEquals("On SU(3)\n\na", manuscript.prose());
        assertEquals(List.of("SU(3)"), manuscript.passages());
        assertEquals(1, manuscript.document().paragraphs().size());
    }

    @Test
    void preamblesOfAChapter() {
        LatexDocument document = Reader.read(
                new irreproof.text.SourceText("chapter.tex", "$\\x$"),
                List.of(new irreproof.text.SourceText("main.tex", "\\def\\x{8}\\begin{document}\\input{chapter}")),
                (from, name) -> java.util.Optional.empty(),
                irreproof.budget.Budget.unlimited());
        assertEquals(
                List.of("8"),
                Stream.of(document.passages().get(0)).map(Manuscript::show).toList());
    }

    @Test
    void aFormulaThatDoesNotEndIsAProblem() {
        assertEquals(
                List.of("the formula that begins in line 2 does not end"),
                Manuscript.of("a\n$3\n\nb").document().problems());
    }
}
