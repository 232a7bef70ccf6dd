package irreproof.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.latex.Cell;
import irreproof.latex.LatexDocument;
import irreproof.latex.Passage;
import irreproof.latex.Reader;
import irreproof.latex.Row;
import irreproof.latex.SourceProvider;
import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RobustnessTest {
    private static final Duration FAR_TOO_LONG = Duration.ofSeconds(60);
    private static final String[] PIECES = {
        "3",
        "\\mathbf{3}",
        "\\mathbf",
        "\\bar",
        "{",
        "}",
        "(",
        ")",
        "[",
        "]",
        "\\otimes",
        "\\oplus",
        "+",
        "-",
        "=",
        "\\to",
        "^",
        "_",
        "'",
        "\\prime",
        "*",
        ",",
        ";",
        "\\frac",
        "1/2",
        "/",
        "\\yng(2,1)",
        "\\yng(",
        "\\young",
        "\\ydiagram",
        "\\begin{ytableau}",
        "\\end{ytableau}",
        "\\\\",
        "&",
        "\\text{x}",
        "\\text",
        "\\left",
        "\\right",
        "\\left(",
        "\\Lambda^2",
        "\\mathrm{Sym}^3",
        "\\underbrace",
        "\\overset",
        "\\stackrel{?}{=}",
        "\\not",
        "\\dots",
        "..",
        ".",
        "\\quad",
        "\\cdot",
        "\\times",
        "\\color{red}",
        "\\bf",
        "\\bullet",
        "_S",
        "_{v}",
        "^{\\otimes 2}",
        "\\otimes_S",
        "\\unknown",
        "a",
        "\\begin",
        "\\end{split}",
        "\\ytableaushort{ab,c}*",
        "\\Yboxdim",
        "\\kern",
        "\\pqty",
        "\\{",
        "\\}",
        "\\,",
        "\\phantom",
        "0"
    };

    @Test
    void anySoupOfTokensIsReadWithoutAnError() {
        long seed = 20260211;
        Random random = new Random(seed);
        int found = 0;
        for (int round = 0; round < 20_000; round++) {
            StringBuilder latex = new StringBuilder();
            for (int size = 1 + random.nextInt(30); size > 0; size--) {
                latex.append(PIECES[random.nextInt(PIECES.length)]).append(random.nextBoolean() ? " " : "");
            }
            String source = "\\[" + latex + "\\]";
            for (Statement statement : Fixtures.statementsIn(source)) {
                found++;
                assertSound(source, statement, "seed " + seed + ": " + source);
            }
        }
        assertTrue(found > 100, "the soup is too thin: " + found);
    }

    /** The shape that everything behind relies on. */
    private static void assertSound(String source, Statement statement, String message) {
        assertFalse(statement.sides().isEmpty(), message);
        assertEquals(statement.sides().size() - 1, statement.relations().size(), message);
        assertEquals(statement.span().of(source), statement.latex(), message);
        for (Expression side : statement.sides()) {
            assertTrue(statement.span().contains(side.span()), message);
            assertNested(side, message);
        }
    }

    private static void assertNested(Expression tree, String message) {
        for (Expression child : Trees.children(tree)) {
            assertTrue(tree.span().contains(child.span()), message);
            assertNested(child, message);
        }
    }

    @Test
    void tokensInAnyOrderAreReadWithoutAnError() {
        long seed = 20260212;
        Random random = new Random(seed);
        String[] words = {"otimes", "mathbf", "young", "begin", "text", "frac", "left", "overset", "Lambda", "unknown"};
        String[] signs = {"(", ")", "[", "]", "=", "+", "'", ".", ",", "′", "⊗", "*"};
        for (int round = 0; round < 20_000; round++) {
            List<Token> tokens = new ArrayList<>();
            for (int i = 0; i < 1 + random.nextInt(25); i++) {
                TokenKind kind = TokenKind.values()[random.nextInt(TokenKind.values().length)];
                String text = switch (kind) {
                    case DIGIT, PARAMETER -> "3";
                    case LETTER -> "S";
                    case CONTROL_WORD -> words[random.nextInt(words.length)];
                    case CONTROL_SYMBOL -> random.nextBoolean() ? "\\" : "{";
                    case OTHER -> signs[random.nextInt(signs.length)];
                    default -> "";
                };
                tokens.add(new Token(kind, text, new Span(i, i + 1)));
            }
            Cell cell = new Cell(tokens, new Span(0, tokens.size()));
            Passage passage = new Passage(
                    Passage.Layout.values()[random.nextInt(3)],
                    "$",
                    List.of(new Row(List.of(cell, cell))),
                    cell.span());
            String source = " ".repeat(tokens.size());
            for (Statement statement : StatementFinder.find(source, passage, Budget.unlimited())) {
                assertEquals(statement.sides().size() - 1, statement.relations().size(), "seed " + seed);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "(",
                "[",
                "{",
                "\\{",
                "\\left(",
                "\\bar{",
                "\\bar",
                "\\mathbf{",
                "\\Lambda^2",
                "\\frac{",
                "\\frac",
                "\\text{",
                "3^",
                "3_",
                "3^{\\otimes 2",
                "\\young(",
                "\\yng",
                "\\ydiagram{",
                "\\begin{ytableau}",
                "\\begin{split}",
                "\\underbrace{",
                "\\pqty{",
                "\\hspace[",
                "\\stackrel",
                "\\not",
                "^2",
                "'",
                "^*",
                "2\\cdot",
                "3\\,",
                "1/",
                "\\quad",
                "&",
                "\\\\",
                ".",
                "\\otimes^2",
                "\\mathrm{Sym}^2",
                "\\textcolor",
                "\\phantom{",
                "\\raisebox",
                "_S",
                "\\color",
                "\\left",
                "-",
                "+"
            })
    void bombsOfOneSortAreReadQuickly(String piece) {
        String bomb = "$" + piece.repeat(20_000) + "3\\otimes 3=\\mathbf{6}\\oplus\\bar 3$";
        List<Statement> statements = assertTimeoutPreemptively(FAR_TOO_LONG, () -> Fixtures.statementsIn(bomb));
        statements.forEach(statement -> assertEquals(statement.span().of(bomb), statement.latex()));
    }

    @Test
    void deepButClosedNestingIsAProblemAndNoCrash() {
        for (String[] pair :
                new String[][] {{"(", ")"}, {"{", "}"}, {"\\bar{", "}"}, {"[", "]"}, {"\\left(", "\\right)"}}) {
            String bomb = "$3\\otimes3=" + pair[0].repeat(5_000) + "6\\oplus\\bar 3" + pair[1].repeat(5_000) + "$";
            List<Statement> statements = assertTimeoutPreemptively(FAR_TOO_LONG, () -> Fixtures.statementsIn(bomb));
            assertEquals(1, statements.size(), pair[0]);
            assertEquals(1, statements.get(0).problems().size(), pair[0]);
        }
    }

    @Test
    void nestingThatPeopleWriteIsRead() {
        String latex = "$3\\otimes3=" + "\\bigl(".repeat(20) + "6\\oplus\\bar 3" + "\\bigr)".repeat(20) + "$";
        List<Statement> statements = Fixtures.statementsIn(latex);
        assertEquals("(x 3 3) = (+ 6 ~3)", Written.statements(statements));
    }

    @Test
    void aLongChainIsRead() {
        String latex = "$" + "\\mathbf{3}\\otimes".repeat(5_000) + "\\mathbf{3}=\\mathbf{1}"
                + "\\oplus\\mathbf{8}".repeat(20_000) + "$";
        List<Statement> statements = assertTimeoutPreemptively(FAR_TOO_LONG, () -> Fixtures.statementsIn(latex));
        assertEquals(
                20_001,
                ((Expression.Sum) statements.get(0).sides().get(1)).terms().size());
        assertEquals(List.of(), statements.get(0).problems());
    }

    @Test
    void anExceededBudgetEndsTheWork() {
        Passage passage = Reader.passage("3\\otimes".repeat(500) + "3").orElseThrow();
        assertThrows(
                BudgetExceeded.class,
                () -> StatementFinder.find("3\\otimes".repeat(500) + "3", passage, Budget.of(100)));
    }

    /** No bar: the figure is printed for whoever reads the build. */
    @Test
    void aThousandStatementsAreRead() {
        StringBuilder source = new StringBuilder();
        for (int i = 0; i < 1000; i++) {
            source.append(
                            "\\begin{align} \\mathbf{8}\\otimes\\overline{\\mathbf{10}} &= \\mathbf{8}\\oplus\\overline{\\mathbf{10}}")
                    .append("\\oplus 2\\,\\mathbf{27} \\\\ &\\quad \\oplus \\left(\\mathbf{35}'\\oplus")
                    .append(i)
                    .append("\\right) = \\yng(2,1) \\end{align}\n");
        }
        LatexDocument document =
                Reader.read(new SourceText("test.tex", source.toString()), SourceProvider.none(), Budget.unlimited());
        int statements = 0;
        long start = System.nanoTime();
        for (Passage passage : document.passages()) {
            statements += StatementFinder.find(source.toString(), passage, Budget.unlimited())
                    .size();
        }
        System.out.println("notation: 1000 statements read in " + (System.nanoTime() - start) / 1_000_000 + " ms");
        assertEquals(1000, statements);
    }
}
