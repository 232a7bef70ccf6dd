package irreproof.check.judge;

import irreproof.check.judge.Interpretation.Lists;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.naming.LieGroup;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Power;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What a bracketed list of numbers denotes in a simple group: Dynkin labels, or a partition by its rows or columns. */
final class BracketNames {
    /** The physics order of nodes as Bourbaki nodes, counted from 0 (Slansky, Phys. Rept. 79, 1981; from memory). */
    private static final int[] E6 = {0, 2, 3, 4, 5, 1};

    private static final int[] E7 = {0, 2, 3, 4, 5, 6, 1};
    private static final int[] E8 = {0, 2, 3, 4, 5, 6, 7, 1};
    private static final int[] G2 = {1, 0};
    private static final int MOST_BOXES = 4096;

    private BracketNames() {}

    /** True if the entries themselves are names: bold, barred or primed. */
    static boolean isTuple(ListName list) {
        return list.entries().stream()
                .anyMatch(entry -> !(entry instanceof NumberName number)
                        ? !(entry instanceof Power)
                        : number.face() != Face.PLAIN || !number.decoration().equals(Decoration.NONE));
    }

    /** The entries as numbers, exponents written out; empty if there is anything else among them. */
    static List<Integer> numbers(ListName list) {
        List<Integer> numbers = new ArrayList<>();
        for (Expression entry : list.entries()) {
            int repeat = 1;
            if (entry instanceof Power power) {
                repeat = power.exponent();
                entry = power.base();
            }
            boolean whole = entry instanceof NumberName number
                    && number.denominator() == 1
                    && number.numerator().bitLength() < 31;
            if (!whole || repeat > MOST_BOXES) {
                return List.of();
            }
            for (int i = 0; i < repeat; i++) {
                numbers.add(((NumberName) entry).numerator().intValue());
            }
        }
        return numbers;
    }

    /** The irrep under one way to read brackets, or empty if the list cannot be read so. */
    static Optional<Decomposition<DominantWeight>> weight(ListName list, Lists sense, LieGroup group) {
        if (isTuple(list)) {
            return Optional.empty();
        }
        List<Integer> numbers = digits(list, group.algebra().rank());
        if (numbers.isEmpty()) {
            numbers = numbers(list);
        }
        if (numbers.isEmpty()) {
            return Optional.empty();
        }
        boolean powers = list.entries().stream().anyMatch(Power.class::isInstance);
        return switch (sense) {
            case DYNKIN_BOURBAKI -> powers ? Optional.empty() : dynkin(numbers, null, group.algebra());
            case DYNKIN_PHYSICS -> {
                int[] order = powers ? null : physicsOrder(group.algebra());
                yield order == null ? Optional.empty() : dynkin(numbers, order, group.algebra());
            }
            case PARTITION_ROWS -> list.bracket() == Bracket.SQUARE || powers
                    ? diagram(numbers, group)
                    : Optional.empty();
            case PARTITION_COLUMNS -> list.bracket() == Bracket.SQUARE ? diagram(conjugate(numbers), group) : Optional.empty();
        };
    }

    /** Labels of one digit each, written without commas, as in (01); empty if the list is not of this form. */
    private static List<Integer> digits(ListName list, int rank) {
        boolean single = rank > 1
                && list.entries().size() == 1
                && list.entries().get(0) instanceof NumberName number
                && number.denominator() == 1
                && number.span().length() == rank;
        if (!single) {
            return List.of();
        }
        String written = ((NumberName) list.entries().get(0)).numerator().toString();
        String padded = "0".repeat(Math.max(0, rank - written.length())) + written;
        return padded.chars().map(digit -> digit - '0').boxed().toList();
    }

    private static int[] physicsOrder(SimpleAlgebra algebra) {
        return switch (algebra.series()) {
            case E -> algebra.rank() == 6 ? E6 : algebra.rank() == 7 ? E7 : E8;
            case G -> G2;
            case A, B, C, D, F -> null;
        };
    }

    private static Optional<Decomposition<DominantWeight>> dynkin(
            List<Integer> numbers, int[] order, SimpleAlgebra algebra) {
        if (numbers.size() != algebra.rank() || numbers.stream().anyMatch(number -> number < 0)) {
            return Optional.empty();
        }
        int[] labels = new int[algebra.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[order == null ? i : order[i]] = numbers.get(i);
        }
        return Optional.of(Decomposition.of(DominantWeight.of(labels)));
    }

    /** The irrep of a diagram of SU(n); zero if a column is longer than n. */
    static Optional<Decomposition<DominantWeight>> diagram(List<Integer> rows, LieGroup group) {
        if (group.algebra().series() != Series.A || group.family() != LieGroup.Family.SU) {
            return Optional.empty();
        }
        long boxes = 0;
        for (int i = 0; i < rows.size(); i++) {
            boxes += rows.get(i);
            if (rows.get(i) < 0 || i > 0 && rows.get(i) > rows.get(i - 1) || boxes > MOST_BOXES) {
                return Optional.empty();
            }
        }
        int size = group.degree();
        long height = rows.stream().filter(row -> row > 0).count();
        if (height > size) {
            return Optional.of(Decomposition.zero());
        }
        int[] labels = new int[size - 1];
        for (int i = 0; i < size - 1; i++) {
            labels[i] = row(rows, i) - row(rows, i + 1);
        }
        return Optional.of(Decomposition.of(DominantWeight.of(labels)));
    }

    private static int row(List<Integer> rows, int index) {
        return index < rows.size() ? rows.get(index) : 0;
    }

    /** Rows from columns; empty if they are no partition. */
    private static List<Integer> conjugate(List<Integer> columns) {
        List<Integer> rows = new ArrayList<>();
        int height = columns.isEmpty() ? 0 : columns.get(0);
        for (int i = 1; i < columns.size(); i++) {
            if (columns.get(i) > columns.get(i - 1)) {
                return List.of(-1);
            }
        }
        if (height > MOST_BOXES) {
            return List.of(-1);
        }
        for (int row = 1; row <= height; row++) {
            int length = row;
            rows.add((int) columns.stream().filter(column -> column >= length).count());
        }
        return rows;
    }
}
