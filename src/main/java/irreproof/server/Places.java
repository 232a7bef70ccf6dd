package irreproof.server;

import irreproof.text.LineIndex;
import irreproof.text.Span;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;

/**
 * The one converter between the program's positions and the client's. Coordinate systems in use:
 *
 * <ul>
 *   <li>offset, {@link Span}: UTF-16 units from the start of the text; everything below this layer;
 *   <li>{@link LineIndex.Position}: line and column from 0, the column in UTF-16 units; the reports add 1 to both;
 *   <li>lsp4j's {@link Position} and {@link Range}: line and character from 0, the character in the units of the
 *       {@link PositionEncoding} that was agreed on with this client.
 * </ul>
 *
 * <p>Lines end at LF, CRLF or CR in all of them. A position outside the text is moved to the nearest place inside, one
 * inside a character to that character's start.
 */
record Places(CharSequence text, LineIndex lines, PositionEncoding encoding) {

    Position position(int offset) {
        LineIndex.Position place = lines.position(offset);
        int start = lines.offset(place.line(), 0);
        int end = start + place.column();
        int units = 0;
        for (int i = start; i < end; ) {
            int codePoint = Character.codePointAt(text, i);
            i += Character.charCount(codePoint);
            units += i <= end ? encoding.units(codePoint) : 0;
        }
        return new Position(place.line(), units);
    }

    int offset(Position position) {
        if (position.getLine() >= lines.lineCount()) {
            return text.length();
        }
        Span line = lines.lineSpan(Math.max(0, position.getLine()));
        int units = 0;
        int i = line.start();
        while (i < line.end()) {
            int codePoint = Character.codePointAt(text, i);
            units += encoding.units(codePoint);
            if (units > position.getCharacter()) {
                return i;
            }
            i += Character.charCount(codePoint);
        }
        return line.end();
    }

    Range range(Span span) {
        return new Range(position(span.start()), position(span.end()));
    }

    /** An inverted range comes out empty. */
    Span span(Range range) {
        int start = offset(range.getStart());
        return new Span(start, Math.max(start, offset(range.getEnd())));
    }
}
