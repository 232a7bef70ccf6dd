package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Irreps of SU(n) and their Young diagrams, given by row lengths: the Dynkin label at node i is the number of columns of
 * length i, and columns of length n do not count (common practice).
 */
public final class YoungDiagrams {
    private YoungDiagrams() {}

    /** The row lengths of an irrep of SU(n), longest first, fewer than n; empty for the trivial irrep. */
    public static List<Integer> rows(DominantWeight irrep) {
        List<Integer> rows = new ArrayList<>();
        int length = 0;
        for (int node = irrep.rank() - 1; node >= 0; node--) {
            length = Math.addExact(length, irrep.label(node));
            if (length > 0) {
                rows.add(0, length);
            }
        }
        return List.copyOf(rows);
    }

    /**
     * The irrep of a diagram.
     *
     * @param rows not increasing, none negative; zeros at the end do not count
     * @return empty if the rows are no diagram, or have more than n of them, or the group is not SU(n), where a diagram
     *     does not say whether traces are taken off
     */
    public static Optional<DominantWeight> irrep(LieGroup group, List<Integer> rows) {
        int rank = group.algebra().rank();
        if (group.family() != LieGroup.Family.SU || !isDiagram(rows) || withoutZeros(rows) > rank + 1) {
            return Optional.empty();
        }
        int[] labels = new int[rank];
        for (int row = 0; row < Math.min(rank, rows.size()); row++) {
            int below = row + 1 < rows.size() ? rows.get(row + 1) : 0;
            labels[row] = rows.get(row) - below;
        }
        return Optional.of(DominantWeight.of(labels));
    }

    private static long withoutZeros(List<Integer> rows) {
        return rows.stream().filter(length -> length > 0).count();
    }

    /** The irrep of a diagram given by its column lengths, longest first; empty as for {@link #irrep}. */
    public static Optional<DominantWeight> irrepOfColumns(LieGroup group, List<Integer> columns) {
        int rank = group.algebra().rank();
        if (group.family() != LieGroup.Family.SU || !isDiagram(columns)) {
            return Optional.empty();
        }
        int[] labels = new int[rank];
        for (int length : columns) {
            if (length > rank + 1) {
                return Optional.empty();
            }
            if (length > 0 && length <= rank) {
                labels[length - 1]++;
            }
        }
        return Optional.of(DominantWeight.of(labels));
    }

    /** Whether the numbers can be row lengths (or column lengths): none negative, none larger than the one before. */
    public static boolean isDiagram(List<Integer> lengths) {
        for (int i = 0; i < lengths.size(); i++) {
            if (lengths.get(i) < 0 || i > 0 && lengths.get(i) > lengths.get(i - 1)) {
                return false;
            }
        }
        return true;
    }

    /** Box characters, one line for each row; a bullet for the empty diagram. */
    static String drawing(List<Integer> rows) {
        return rows.isEmpty()
                ? "\u2022"
                : String.join("\n", rows.stream().map("\u25a1"::repeat).toList());
    }

    /** Row lengths with repetitions as exponents: {@code (2,1^48)}. */
    static String partition(List<Integer> rows) {
        StringBuilder text = new StringBuilder("(");
        int row = 0;
        while (row < rows.size()) {
            int next = row;
            while (next < rows.size() && rows.get(next).equals(rows.get(row))) {
                next++;
            }
            text.append(row == 0 ? "" : ",").append(rows.get(row));
            if (next - row > 1) {
                text.append('^').append(next - row);
            }
            row = next;
        }
        return text.append(')').toString();
    }
}
