package irreproof.latex;

import irreproof.text.Span;
import java.util.List;

/**
 * A document, a passage or a snippet flattened to what a reader sees, for finding words and group names in it: macros
 * expanded, styling dropped ({@code \mathrm{SU}(3)} gives {@code SU(3)}, {@code \mathfrak{su}(3)} gives {@code su(3)}),
 * operators as Unicode ({@code \times} gives {@code ×}, {@code \to} and its kin {@code →}, {@code \supset} {@code ⊃},
 * {@code \otimes} {@code ⊗}, {@code \oplus} {@code ⊕}), subscripts kept as {@code _{...}}, spacing commands as one
 * blank, math shifts dropped, a paragraph break as two line feeds, a comment or verbatim text as nothing.
 *
 * @param origins for each character of the text, the span in the main document it stands for
 */
public record PlainText(String text, List<Span> origins) {
    public PlainText {
        if (text.length() != origins.size()) {
            throw new IllegalArgumentException("one origin per character");
        }
    }

    /** The place in the main document of the characters from start to end (end exclusive, at least one character). */
    public Span origin(int start, int end) {
        Span place = origins.get(start);
        for (int i = start + 1; i < end; i++) {
            place = place.cover(origins.get(i));
        }
        return place;
    }
}
