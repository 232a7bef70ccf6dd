package irreproof.latex;

import irreproof.text.Span;
import java.util.List;

/** What stands between two {@code &} of a row: expanded tokens, without comments and math shifts. */
public record Cell(List<Token> tokens, Span span) {
    public Cell {
        tokens = List.copyOf(tokens);
    }
}
