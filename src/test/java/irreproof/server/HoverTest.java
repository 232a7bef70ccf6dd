package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import irreproof.check.Card;
import java.util.List;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.Position;
import org.junit.jupiter.api.Test;

/** Hover shows the innermost card. */
class HoverTest {
    private static final String MARKDOWN =
            "{capabilities: {textDocument: {hover: {contentFormat: ['markdown', 'plaintext']}}}}";

    private static void hovers(String capabilities, String marked, String expected) {
        Marked place = Marked.of(marked);
        try (Editor editor = Editor.with(capabilities)) {
            editor.open(place.text());
            Position start = place.range().getStart();
            Hover hover = Editor.await(editor.askHover(start.getLine(), start.getCharacter()));
            assertEquals(expected, hover.getContents().getRight().getValue());
            assertEquals(place.range(), hover.getRange());
        }
    }

    @Test
    void onAnIrrepInMarkdown() {
        hovers(MARKDOWN, """
                \\[ 3 \\otimes 3 = 6 \\oplus 4 \\]
                                 ^
                """, "**6'**\n\n- dimension: 6");
    }

    @Test
    void onAnIrrepInPlainText() {
        hovers("{}", """
                \\[ 3 \\otimes 3 = 6 \\oplus 4 \\]
                   ^
                """, "3'\n\ndimension: 3");
    }

    @Test
    void onTheStatementAround() {
        Marked operator = Marked.of("""
                In group SU(3) we have
                \\[ 3 \\otimes 3 = 6 \\oplus 4 \\]
                     ^^^^^^^
                """);
        try (Editor editor = Editor.with(MARKDOWN)) {
            editor.open(operator.text());
            Position start = operator.range().getStart();
            assertEquals(
                    "**`3 \\otimes 3 = 6 \\oplus 4`**\n\n- group: SU(3)",
                    editor.hover(start.getLine(), start.getCharacter()));
        }
    }

    @Test
    void theGroupOfTheSettingsIsUsed() {
        try (Editor editor = Editor.with("{initializationOptions: {group: 'SU(2)'}}")) {
            editor.open("2 \\otimes 2 = 3 \\oplus 1");
            assertEquals("2 \\otimes 2 = 3 \\oplus 1\n\ngroup: SU(2)", editor.hover(0, 3));
        }
    }

    @Test
    void nothingElsewhere() {
        try (Editor editor = Editor.plain()) {
            editor.open("2 \\otimes 2 = 3 \\oplus 1 and so on");
            assertNull(editor.hover(0, 26));
            assertNull(editor.hover(9, 0));
        }
    }

    @Test
    void betweenTwoNeighboursTheRightOneCounts() {
        try (Editor editor = Editor.plain()) {
            editor.open("2 \\otimes 2 = 3 \\oplus 1");
            assertEquals("2 \\otimes 2 = 3 \\oplus 1\n\ngroup: ", editor.hover(0, 1));
            // Behind the last character a cursor still means the last name.
            assertEquals("1'\n\ndimension: 1", editor.hover(0, 24));
        }
    }

    @Test
    void markupInValuesIsShownAsItIs() {
        List<Card.Row> rows = List.of(
                new Card.Row("Dynkin label", "(1,0)"),
                new Card.Row("Product", "\\mathbf{8}_a * ``x``"),
                new Card.Row("Young diagram", "**\n*"));
        assertEquals("""
                **8**

                - Dynkin label: (1,0)
                - Product: ``` \\mathbf{8}_a * ``x`` ```
                - Young diagram:

                ```text
                **
                *
                ```""", new CardText("8", rows).in(true).getValue());
        assertEquals("""
                8

                Dynkin label: (1,0)
                Product: \\mathbf{8}_a * ``x``
                Young diagram:
                  **
                  *""", new CardText("8", rows).in(false).getValue());
    }
}
