package irreproof.engine;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

/**
 * A partition, the row lengths of a Young diagram from the top: weakly decreasing, without zeros. Ordered by the number
 * of boxes, then lexicographically, longer rows first.
 */
public record Partition(List<Integer> rows) implements Comparable<Partition> {
    /** @throws IllegalArgumentException if a row is negative or longer than the one above it; zero rows are dropped */
    public Partition {
        List<Integer> kept = new ArrayList<>(rows.size());
        int above = Integer.MAX_VALUE;
        for (int row : rows) {
            if (row < 0 || row > above) {
                throw new IllegalArgumentException("not a partition: " + rows);
            }
            if (row > 0) {
                kept.add(row);
            }
            above = row;
        }
        rows = List.copyOf(kept);
    }

    // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

    @Override
    public boolean equals(Object other) {
        return other instanceof Partition that && rows.equals(that.rows);
    }

    @Override
    public int hashCode() {
        return rows.hashCode();
    }

    public static Partition of(int... rows) {
        return new Partition(Arrays.stream(rows).boxed().toList());
    }

    /** A diagram of one column. */
    public static Partition column(int boxes) {
        return new Partition(Collections.nCopies(boxes, 1));
    }

    /** The number of rows, which is the length of the first column. */
    public int length() {
        return rows.size();
    }

    /** The length of a row counted from 0; 0 below the diagram. */
    public int row(int index) {
        return index < rows.size() ? rows.get(index) : 0;
    }

    /** The number of boxes. */
    public long size() {
        return rows.stream().mapToLong(Integer::longValue).sum();
    }

    @Override
    public int compareTo(Partition other) {
        int bySize = Long.compare(size(), other.size());
        for (int i = 0; bySize == 0 && i < Math.max(length(), other.length()); i++) {
            if (row(i) != other.row(i)) {
                return Integer.compare(other.row(i), row(i));
            }
        }
        return bySize;
    }

    /** {@code [3, 1]}. */
    @Override
    public String toString() {
        return rows.toString();
    }
}
