package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What definitions mean: The TeXbook chapters 20 and 24, the LaTeX kernel's manual (usrguide) for the document commands. */
final class MacroTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "\\newcommand{\\x}{8} $\\x$ | 8",
                "\\newcommand*\\x[1]{<#1>} $\\x8 \\x{10}$ | <8> <10>",
                "\\newcommand{\\x}[2][3]{#1,#2} $\\x{8}\\x[1]{8}$ | 3,81,8",
                "\\newcommand{\\x}[2][3]{#1,#2} $\\x[{]}]{8}$ | {]},8",
                "\\renewcommand{\\v}{\\mathbf{8_v}} $\\v \\v$ | \\mathbf{8_v}\\mathbf{8_v}",
                "\\renewcommand{\\,}{8} $\\,$ | 8",
                "\\newcommand{\\x}{1}\\providecommand{\\x}{2}\\providecommand{\\y}{3} $\\x\\y$ | 13",
                "\\DeclareRobustCommand{\\x}[1]{#1#1} $\\x{8}$ | 88",
                "\\def\\x#1#2{#2#1} $\\x{1}2$ | 21",
                "\\def\\x(#1){\\mathrm{SU}(#1)} $\\x(3)$ | \\mathrm{SU}(3)",
                "\\def\\x#1.#2;{#2:#1} $\\x12.{3};$ | 3:12",
                "\\def\\x{1}\\def\\y{\\x}\\def\\x{2} $\\y$ | 2",
                "\\def\\x{1}\\let\\y=\\x\\def\\x{2} $\\y$ | 1",
                "\\let\\oldbar\\bar\\renewcommand{\\bar}[1]{\\oldbar{#1}'} $\\bar3$ | \\bar{3}'",
                "\\DeclareMathOperator{\\Sym}{Sym} $\\Sym^2$ | \\operatorname{Sym}^2",
                "\\DeclareMathOperator*{\\Sym}{Sym} $\\Sym$ | \\operatorname*{Sym}",
                "\\DeclarePairedDelimiter\\set{<}{>} $\\set{3}\\set*{4}\\set[\\big]{5}$ | <3><4><5>",
                "\\NewDocumentCommand{\\x}{m O{7} m}{#1#2#3} $\\x{1}{3}\\x{1}[2]{3}$ | 173123",
                "\\NewDocumentCommand{\\x}{s o m}{\\IfBooleanTF{#1}{A}{B}\\IfNoValueTF{#2}{C}{#2}#3} $\\x{1}\\x*[2]{3}$ | BC1A23",
                "\\def\\x#1{\\def\\y##1{#1##1}} $\\x{3}\\y{4}$ | 34",
                "\\makeatletter\\def\\r@p{8}\\def\\x{\\r@p}\\makeatother $\\x$ | 8",
                "\\NewDocumentEnvironment{e}{m}{\\begin{align}#1&}{#1\\end{align}}\\begin{e}{8}=\\end{e} | 8 & =8",
                "\\def\\eqna{\\begin{eqnarray}}\\def\\endeqna{\\end{eqnarray}}\\begin{eqna}8&=&1\\end{eqna} | 8 & = & 1",
                "\\newenvironment{e}{\\eqnarray}{\\endeqnarray}\\begin{e}8&=&1\\end{e} | 8 & = & 1",
                "\\newcommand{\\x}[1][]{\\ifthenelse{\\equal{#1}{}}{8}{#1}} $\\x\\x[3]$ | 83",
                "\\NewDocumentCommand{\\x}{O{}D(){7}t+m}{\\IfBlankTF{#1}{8}{#1}#2\\IfBooleanT{#3}{+}#4} $\\x1\\x[2](3)+4$ | 871"
                        + "23+4",
                "\\makeatletter\\def\\x{\\@ifnextchar[{\\y}{\\y[1]}}\\def\\y[#1]{#1}\\@namedef{r3}{\\mathbf3}\\makeatother $\\x[2]\\x\\csname r3\\endcsname$ | 21\\mathbf3",
                "\\lstnewenvironment{code}{}{}\\begin{code}$1$\\end{code}$2$ | 2",
                "\\expandafter\\def\\csname x\\endcsname{8} $\\csname x\\endcsname$ | 8",
                "\\newcommand{\\x}{\\ensuremath{8}} $\\x$ | {8}",
                "\\newcommand{\\x}{\\ifmmode8\\else9\\fi} $\\x$ | 8",
                "\\newcommand{\\x}[1]{\\ifx\\relax#1\\relax8\\else[#1]\\fi} $\\x{}\\x{3}$ | 8[3]",
                "\\def\\x{\\@ifstar{\\y}{\\z}}\\makeatletter\\def\\x{\\@ifstar{\\y}{\\z}}\\makeatother \\def\\y{8}\\def\\z{9} $\\x*\\x$ | 89",
                "\\newif\\iffull \\def\\x{\\iffull 1\\else 2\\fi} \\fulltrue $\\x\\fullfalse\\x$ | 12",
                "\\iffalse $1$ \\iftrue\\fi \\else $2$ \\fi | 2",
                "\\iffalse $1$\\ifpdf $2$\\else $3$\\fi $4$\\fi $5$ | 5",
                "\\newcommand{\\x}[1]{\\ifnum#1=1 a\\else b\\fi} $\\x{1}\\x{2}$ | ab",
            })
    void expands(String latex, String expected) {
        Manuscript manuscript = Manuscript.of(latex);
        assertEquals(List.of(expected), manuscript.passages(), latex);
    }

    @Test
    void aDefinitionAppliesFromItsPlaceOn() {
        assertEquals(
                List.of("\\x", "1", "2"),
                Manuscript.of("$\\x$ \\def\\x{1} $\\x$ \\def\\x{2} $\\x$").passages());
    }

    @Test
    void aDefinitionEndsWithItsGroup() {
        assertEquals(
                List.of("2", "1", "3", "1", "4", "1"),
                Manuscript.of("\\def\\x{1}{\\def\\x{2}$\\x$}$\\x$\\begin{quote}\\def\\x{3}$\\x$\\end{quote}$\\x$"
                                + "$\\def\\x{4}\\x$ $\\x$")
                        .passages());
        assertEquals(
                List.of("2"), Manuscript.of("\\def\\x{1}{\\gdef\\x{2}}$\\x$").passages());
    }

    @Test
    void groupsInAPreambleDoNotHideDefinitions() {
        assertEquals(
                List.of("1"),
                Manuscript.of("\\AtBeginDocument{\\def\\x{1}}\\begin{document}$\\x$\\end{document}")
                        .passages());
    }

    @Test
    void structureKeepsItsMeaning() {
        Manuscript manuscript = Manuscript.of("\\renewcommand{\\section}[1]{}\\section{On $8$}");
        assertEquals(List.of("8"), manuscript.passages());
        assertEquals(1, manuscript.document().headings().size());
    }

    @Test
    void anUnknownConditionalSpoilsItsPassageOnly() {
        Manuscript manuscript = Manuscript.of("$1$ $2\\ifodd\\count 3\\else4\\fi$ $5$");
        assertEquals(List.of("1", "5"), manuscript.passages());
        assertEquals(1, manuscript.document().problems().size());
    }

    @Test
    void bothBranchesOfAnUnknownSwitchAreRead() {
        assertEquals(
                List.of("1", "2", "3"),
                Manuscript.of("\\ifclassswitch $1$\\else $2$\\fi $3$").passages());
    }

    @Test
    void aConditionalWithoutEndIsAProblem() {
        Manuscript manuscript = Manuscript.of("$1$ \\iffalse $2$");
        assertEquals(List.of("1"), manuscript.passages());
        assertEquals(
                List.of("\\iffalse has no \\fi; the rest is not read"),
                manuscript.document().problems());
    }

    @Test
    void includedFiles() {
        Manuscript manuscript = Manuscript.of("\\documentclass{own}\\usepackage[a]{b, style}\\begin{document}"
                        + "\\input macros $\\a\\b\\c\\d$ \\include{chapter}$\\e$\\end{document}")
                .with("own.cls", "\\newcommand{\\a}{1}")
                .with("style.sty", "\\RequirePackage{deep}\\newcommand\\b{\\b@}\\def\\b@{2}")
                .with("deep.sty", "\\def\\c{3}")
                .with("macros.tex", "\\begingroup\\gdef\\d{4}\\endgroup\\input{macros}\\input{main.tex}")
                .with("chapter.tex", "$7$ \\def\\e{5}");
        assertEquals(List.of("1234", "5"), manuscript.passages());
        assertEquals(List.of(), manuscript.document().problems());
        assertTrue(manuscript.document().macros().names().contains("d"));
    }

    @Test
    void includedFilesWithoutEndStop() {
        Manuscript manuscript = Manuscript.of("\\input{a0} $1$");
        for (int i = 0; i < 40; i++) {
            manuscript.with("a" + i, "\\input{a" + (i + 1) + "}");
        }
        assertEquals(List.of("1"), manuscript.passages());
        assertEquals(1, manuscript.document().problems().size());
    }
}
