package irreproof.notation;

import java.math.BigInteger;
import java.util.List;

/**
 * One term of a sum to be written: an irrep and how often it occurs.
 *
 * @param count 1 or more
 */
public record WrittenTerm(BigInteger count, WrittenName name) {
    public WrittenTerm {
        if (count.signum() <= 0) {
            throw new IllegalArgumentException("a term that does not occur: " + count);
        }
    }

    /** An irrep by one kind of name. */
    public sealed interface WrittenName {}

    /**
     * A dimension name.
     *
     * @param label the subscript that is part of the name ({@code v}), or empty
     */
    public record Dimension(BigInteger dimension, int bars, int primes, String label) implements WrittenName {
        // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

        @Override
        public boolean equals(Object other) {
            return other instanceof Dimension that
                    && bars == that.bars
                    && primes == that.primes
                    && dimension.equals(that.dimension)
                    && label.equals(that.label);
        }

        @Override
        public int hashCode() {
            return 31 * dimension.hashCode() + 2 * primes + bars;
        }
    }

    /** Dynkin labels, or the entries of any other list in the author's brackets. */
    public record Labels(List<Integer> labels) implements WrittenName {
        public Labels {
            labels = List.copyOf(labels);
        }
    }

    /** A Young diagram by its row lengths, longest first; empty for the singlet. */
    public record Diagram(List<Integer> rows) implements WrittenName {
        public Diagram {
            rows = List.copyOf(rows);
        }
    }

    /**
     * A spin.
     *
     * @param doubled twice the spin
     */
    public record Spin(int doubled) implements WrittenName {}

    /**
     * An irrep of a product group, or one with charges.
     *
     * @param entries a name for each simple factor
     * @param charges a number for each U(1) as plain text: {@code -1/3}
     */
    public record Tuple(List<WrittenName> entries, List<String> charges) implements WrittenName {
        public Tuple {
            entries = List.copyOf(entries);
            charges = List.copyOf(charges);
        }
    }
}
