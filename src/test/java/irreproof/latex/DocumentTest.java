package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.text.MarkedText;
import irreproof.text.SourceText;
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
    void aChapterUsesWhatItsDocumentDefinesBefore() {
        SourceText chapter = new SourceText("chapter.tex", "$\\x\\y\\z\\w$");
        SourceText root = new SourceText(
                "main.tex",
                "\\def\\x{8}\\begin{document}\\input{macros}\\include{other}\\include{chapter}\\def\\z{10}\\end{document}");
        SourceText macros = new SourceText("macros", "\\def\\y{3}");
        SourceText other = new SourceText("other", "\\def\\w{6}");
        SourceProvider sources = (from, name) -> Stream.of(macros, other, chapter)
                .filter(file -> file.path().equals(name) || file.path().equals(name + ".tex"))
                .findFirst();
        LatexDocument document = Reader.read(chapter, List.of(root), sources, Budget.unlimited());
        assertEquals(
                List.of("83\\z\\w"),
                document.passages().stream().map(Manuscript::show).toList());
    }

    @Test
    void aFormulaThatDoesNotEndIsAProblem() {
        assertEquals(
                List.of("the formula that begins in line 2 does not end"),
                Manuscript.of("a\n$3\n\nb").document().problems());
    }
}
