package irreproof.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Columns in the three units of the language server protocol (specification 3.17, "Position"). */
final class SourceTextTest {
    private static final SourceText TEXT = new SourceText("x", "a\n\u00e9\u2297\ud835\udfdbz\r\nb");

    @Test
    void columnsInEveryUnit() {
        int z = TEXT.content().indexOf('z');
        assertEquals(new LineIndex.Position(1, 9), TEXT.position(z, ColumnUnit.UTF_8));
        assertEquals(new LineIndex.Position(1, 4), TEXT.position(z, ColumnUnit.UTF_16));
        assertEquals(new LineIndex.Position(1, 3), TEXT.position(z, ColumnUnit.UTF_32));
    }

    @Test
    void offsetsComeBack() {
        for (ColumnUnit unit : ColumnUnit.values()) {
            int z = TEXT.content().indexOf('z');
            LineIndex.Position position = TEXT.position(z, unit);
            assertEquals(z, TEXT.offset(position.line(), position.column(), unit));
            assertEquals(z + 1, TEXT.offset(1, 1000, unit));
            assertEquals(TEXT.content().length(), TEXT.offset(1000, 0, unit));
            assertEquals(0, TEXT.offset(-1, 0, unit));
        }
    }

    @Test
    void aColumnInsideACharacterIsBeforeIt() {
        assertEquals(2, TEXT.offset(1, 1, ColumnUnit.UTF_8));
        assertEquals(3, TEXT.offset(1, 3, ColumnUnit.UTF_8));
        assertEquals(4, TEXT.offset(1, 7, ColumnUnit.UTF_8));
    }
}
