package irreproof.check;

import irreproof.text.Span;
import java.util.List;

/**
 * What an editor shows when the author points at a place: an irrep (its dimension, Dynkin label, Young diagram, ...), a
 * product (its decomposition), a group.
 *
 * @param title one line, such as {@code 15' of SU(3)}
 * @param rows label and value pairs, in the order to show them; values are plain text, a value may have several lines
 */
public record Card(Span span, String title, List<Row> rows) {
    public Card {
        rows = List.copyOf(rows);
    }

    /** One line of a card. */
    public record Row(String label, String value) {}
}
