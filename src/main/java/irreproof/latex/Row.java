package irreproof.latex;

import java.util.List;

/** What stands between two {@code \\} of a passage; a passage without any has one row with one cell. */
public record Row(List<Cell> cells) {
    public Row {
        cells = List.copyOf(cells);
    }
}
