package irreproof.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Lines end at LF, CRLF and CR alike; what lies outside is clamped. */
final class LineIndexTest {
    @Test
    void allLineEnds() {
        LineIndex lines = new LineIndex("ab\ncd\r\nef\rgh");
        assertEquals(4, lines.lineCount());
        assertEquals(new LineIndex.Position(1, 1), lines.position(4));
        assertEquals(new LineIndex.Position(2, 0), lines.position(7));
        assertEquals(new LineIndex.Position(3, 2), lines.position(12));
        assertEquals(new Span(3, 5), lines.lineSpan(1));
    }

    @Test
    void anOffsetInsideALineEndBelongsToItsLine() {
        LineIndex lines = new LineIndex("ab\r\ncd");
        assertEquals(new LineIndex.Position(0, 2), lines.position(3));
    }

    @Test
    void outsideIsClamped() {
        LineIndex lines = new LineIndex("ab\n");
        assertEquals(2, lines.offset(0, 99));
        assertEquals(3, lines.offset(99, 0));
        assertEquals(new LineIndex.Position(1, 0), lines.position(99));
        assertEquals(new LineIndex.Position(0, 0), new LineIndex("").position(0));
    }
}
