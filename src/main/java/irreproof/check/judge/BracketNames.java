package irreproof.check.judge;

import irreproof.check.judge.Interpretation.Lists;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.naming.Candidate;
import irreproof.naming.DynkinNumbering;
import irreproof.naming.LieGroup;
import irreproof.naming.YoungDiagrams;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Power;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What a bracketed list of numbers denotes in a simple group: Dynkin labels, a partition, or the rank of a tensor. */
final class BracketNames {
    private static final int MOST_BOXES = 4096;

    private BracketNames() {}

    /** True if the entries themselves are names, bold, barred or primed: an irrep of a product group. */
    static boolean isTuple(ListName list) {
        return list.entries().size() > 1
                && list.entries().stream()
                        .anyMatch(entry -> !(entry instanceof NumberName number)
                                ? !(entry instanceof Power)
                                : number.face() != Face.PLAIN
                                        || !number.decoration().isEmpty());
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

    /** The only entry of round brackets, which may stand there for nothing. */
    static Optional<NumberName> grouped(ListName list) {
        boolean single = list.entries().size() == 1;
        return single && list.entries().get(0) instanceof NumberName number ? Optional.of(number) : Optional.empty();
    }

    /** What tells the list from others: (01) and (1) differ. */
    static String text(ListName list) {
        return list.bracket() + " " + numbers(list) + " " + list.entries().size() + " "
                + list.entries().get(0).span().length() + list.decoration().label();
    }

    /** The irrep under one way to read brackets, or empty if the list cannot be read so. */
    static Optional<Decomposition<DominantWeight>> value(ListName list, Lists sense, LieGroup group) {
        List<Integer> numbers = numbers(list);
        if (isTuple(list) || numbers.isEmpty()) {
            return Optional.empty();
        }
        boolean powers = list.entries().stream().anyMatch(Power.class::isInstance);
        boolean square = list.bracket() == Bracket.SQUARE;
        return switch (sense) {
            case DYNKIN_BOURBAKI -> powers ? Optional.empty() : dynkin(labels(list, numbers, group), false, group);
            case DYNKIN_SLANSKY -> powers ? Optional.empty() : dynkin(labels(list, numbers, group), true, group);
            case PARTITION_ROWS -> square || powers ? diagram(numbers, group) : Optional.empty();
            case PARTITION_COLUMNS -> square ? columns(numbers, group) : Optional.empty();
            case GROUPED -> Optional.empty();
            case TENSOR_RANK -> powers ? Optional.empty() : TensorRanks.value(list, numbers, group);
        };
    }

    /** Labels of one digit each may be written without commas, as in (01). */
    private static List<Integer> labels(ListName list, List<Integer> numbers, LieGroup group) {
        int rank = group.algebra().rank();
        boolean single = rank > 1
                && list.entries().size() == 1
                && list.entries().get(0) instanceof NumberName number
                && number.span().length() == rank;
        if (!single) {
            return numbers;
        }
        String written = String.valueOf(numbers.get(0));
        String padded = "0".repeat(Math.max(0, rank - written.length())) + written;
        return padded.chars().map(digit -> digit - '0').boxed().toList();
    }

    private static Optional<Decomposition<DominantWeight>> dynkin(
            List<Integer> labels, boolean slansky, LieGroup group) {
        Series series = group.algebra().series();
        if (slansky && series != Series.E && series != Series.G) {
            return Optional.empty();
        }
        List<Candidate> candidates = DynkinNumbering.candidates(
                group, labels.stream().mapToInt(Integer::intValue).toArray());
        if (candidates.isEmpty()) {
            return Optional.empty();
        }
        Candidate chosen = candidates.get(slansky ? candidates.size() - 1 : 0);
        return Optional.of(Decomposition.of(chosen.irrep()));
    }

    /** The irrep of a diagram of SU(n) by its row lengths; zero if a column is longer than n. */
    static Optional<Decomposition<DominantWeight>> diagram(List<Integer> rows, LieGroup group) {
        return isDiagram(rows, group)
                ? Optional.of(
                        YoungDiagrams.irrep(group, rows).map(Decomposition::of).orElse(Decomposition.zero()))
                : Optional.empty();
    }

    /** A column longer than n is a sign that columns are not meant. */
    private static Optional<Decomposition<DominantWeight>> columns(List<Integer> columns, LieGroup group) {
        return isDiagram(columns, group)
                ? YoungDiagrams.irrepOfColumns(group, columns).map(Decomposition::of)
                : Optional.empty();
    }

    private static boolean isDiagram(List<Integer> lengths, LieGroup group) {
        long boxes = lengths.stream().mapToLong(Integer::longValue).sum();
        return group.family() == LieGroup.Family.SU && boxes <= MOST_BOXES && YoungDiagrams.isDiagram(lengths);
    }
}
