package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import irreproof.text.LineIndex;
import irreproof.text.Span;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextEdit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Positions in the units of the client, with letters that count differently before the statement. */
class PositionEncodingTest {
    private static final String LINE = "For 𝔰𝔲(3) é — 3 \\otimes 3 = 6 \\oplus 4 𝟛";

    /** Columns computed by other means than the program's: encode the text before it and count. */
    private static int units(String text, PositionEncoding encoding) {
        return switch (encoding) {
            case UTF_8 -> text.getBytes(StandardCharsets.UTF_8).length;
            case UTF_16 -> text.getBytes(StandardCharsets.UTF_16BE).length / 2;
            case UTF_32 -> text.codePointCount(0, text.length());
        };
    }

    private static int column(String until, PositionEncoding encoding) {
        return units(LINE.substring(0, LINE.indexOf(until)), encoding);
    }

    @ParameterizedTest
    @EnumSource(PositionEncoding.class)
    void everythingUsesTheUnitsOfTheClient(PositionEncoding encoding) {
        try (Editor editor = Editor.with("{capabilities: {general: {positionEncodings: ['utf-7', '" + encoding.word()
                + "', 'utf-16']}, textDocument: {codeAction: {codeActionLiteralSupport: {codeActionKind: {valueSet: []"
                + "}}}}}}")) {
            editor.open("\n" + LINE);
            Range marked = editor.nextDiagnostics().getDiagnostics().get(0).getRange();
            assertEquals(
                    new Range(
                            new Position(1, column("6 \\oplus 4", encoding)), new Position(1, column(" 𝟛", encoding))),
                    marked);
            assertEquals("6'\n\ndimension: 6", editor.hover(1, column("6 \\oplus", encoding)));
            TextEdit edit = editor.codeActions(
                            new Range(marked.getStart(), marked.getStart()), new CodeActionContext(List.of()))
                    .get(0)
                    .getRight()
                    .getEdit()
                    .getChanges()
                    .get(Editor.URI)
                    .get(0);
            assertEquals(
                    new Range(new Position(1, column("4 𝟛", encoding)), new Position(1, column(" 𝟛", encoding))),
                    edit.getRange());
            editor.change(2, new TextDocumentContentChangeEvent(edit.getRange(), edit.getNewText()));
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics());
        }
    }

    @Test
    void theAgreedEncodingIsNamedOnlyIfOffered() {
        assertEncoding(null, "{}");
        assertEncoding("utf-32", "{capabilities: {general: {positionEncodings: ['utf-32', 'utf-8']}}}");
        assertEncoding(null, "{initializationOptions: {positionEncoding: 'utf-8'}}");
        assertEncoding(
                "utf-8",
                "{capabilities: {general: {positionEncodings: ['utf-16', 'utf-8']}},"
                        + " initializationOptions: {positionEncoding: 'utf-8'}}");
    }

    private static void assertEncoding(String expected, String initialize) {
        try (Editor editor = Editor.fresh()) {
            assertEquals(
                    expected, editor.initialize(initialize).getCapabilities().getPositionEncoding(), initialize);
        }
    }

    @Test
    void aClientThatCannotNegotiateIsBelievedItsSettings() {
        try (Editor editor = Editor.with("{initializationOptions: {positionEncoding: 'utf-8'}}")) {
            editor.open(LINE);
            assertEquals(
                    column("6 \\oplus 4", PositionEncoding.UTF_8),
                    editor.nextDiagnostics()
                            .getDiagnostics()
                            .get(0)
                            .getRange()
                            .getStart()
                            .getCharacter());
        }
    }

    @ParameterizedTest
    @EnumSource(PositionEncoding.class)
    void offsetsAndPositionsAreInverse(PositionEncoding encoding) {
        String text = "aé—𝔰\r\n\r𝟛\n\uD835x";
        Places places = new Places(text, new LineIndex(text), encoding);
        for (int offset = 0; offset <= text.length(); offset++) {
            boolean insideLineEnd = offset > 0 && text.startsWith("\r\n", offset - 1);
            boolean insideCharacter = offset > 0
                    && offset < text.length()
                    && Character.isSurrogatePair(text.charAt(offset - 1), text.charAt(offset));
            int expected = insideLineEnd || insideCharacter ? offset - 1 : offset;
            assertEquals(expected, places.offset(places.position(offset)), "offset " + offset);
        }
    }

    @ParameterizedTest
    @EnumSource(PositionEncoding.class)
    void positionsOutsideTheTextAreClamped(PositionEncoding encoding) {
        String text = "𝔰é\nb";
        Places places = new Places(text, new LineIndex(text), encoding);
        assertEquals(3, places.offset(new Position(0, 99)));
        assertEquals(text.length(), places.offset(new Position(7, 0)));
        assertEquals(0, places.offset(new Position(-1, -1)));
        assertEquals(new Span(4, 4), places.span(new Range(new Position(1, 0), new Position(0, 0))));
    }

    @Test
    void anUnofferedOverrideIsNotNamed() {
        try (Editor editor = Editor.fresh()) {
            assertNull(editor.initialize("{capabilities: {general: {positionEncodings: ['utf-16']}},"
                            + " initializationOptions: {positionEncoding: 'utf-32'}}")
                    .getCapabilities()
                    .getPositionEncoding());
        }
    }
}
