package irreproof.naming;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Rational;
import irreproof.engine.lie.CongruenceClass;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Invariants;
import irreproof.engine.lie.Reality;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import irreproof.naming.IrrepFacts.Line;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Gathers the {@link IrrepFacts} of an irrep. Only the name has a cost that grows with the dimension. */
public final class Facts {
    /** A drawing beyond this is no help; the row lengths are given instead. */
    private static final int LARGEST_DRAWING = 24;

    private Facts() {}

    /** @throws BudgetExceeded if cancelled; a name that outgrows the budget is left out */
    public static IrrepFacts of(LieGroup group, DominantWeight irrep, Budget budget) {
        SimpleAlgebra algebra = group.algebra();
        boolean anomalous = group.family() == LieGroup.Family.SU && algebra.rank() >= 2;
        BigInteger dimension = WeylDimension.dimension(algebra, irrep);
        BigInteger index = Invariants.dynkinIndex(algebra, irrep);
        Rational casimir = Invariants.quadraticCasimir(algebra, irrep);
        Reality reality = Invariants.reality(algebra, irrep);
        Optional<List<Integer>> rows =
                group.family() == LieGroup.Family.SU ? Optional.of(YoungDiagrams.rows(irrep)) : Optional.empty();
        Optional<BigInteger> anomaly =
                anomalous ? Optional.of(Invariants.cubicAnomaly(algebra, irrep)) : Optional.empty();
        Optional<Rational> spin = algebra.rank() == 1 ? Optional.of(Spins.spin(irrep)) : Optional.empty();

        List<Line> lines = new ArrayList<>();
        lines.add(new Line("dimension", dimension.toString()));
        spin.ifPresent(value -> lines.add(new Line("spin", value.toString())));
        lines.add(new Line("Dynkin label", dynkinLabel(algebra, irrep)));
        rows.ifPresent(value -> lines.add(new Line("Young diagram", diagram(value))));
        congruenceClass(algebra, irrep).ifPresent(lines::add);
        DominantWeight smallest = smallest(group);
        String reference = "the " + WeylDimension.dimension(algebra, smallest) + " has ";
        lines.add(new Line(
                "index",
                "l = " + index + ", T = l/2 = " + new Rational(index, BigInteger.TWO) + " (" + reference + "l = "
                        + Invariants.dynkinIndex(algebra, smallest) + ")"));
        lines.add(new Line(
                "quadratic Casimir",
                casimir + " (" + reference + Invariants.quadraticCasimir(algebra, smallest) + ")"));
        lines.add(new Line("reality", reality.name().toLowerCase(Locale.ROOT)));
        anomaly.ifPresent(value -> lines.add(new Line("cubic anomaly", value + " (" + reference + "1)")));
        return new IrrepFacts(
                group,
                irrep,
                label(group, irrep, budget),
                dimension,
                rows,
                index,
                casimir,
                reality,
                anomaly,
                spin,
                lines);
    }

    private static Optional<IrrepLabel> label(LieGroup group, DominantWeight irrep, Budget budget) {
        try {
            return Optional.of(new DimensionNames(group).labelOf(irrep, budget));
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
            return Optional.empty();
        }
    }

    private static String dynkinLabel(SimpleAlgebra algebra, DominantWeight irrep) {
        int[] slansky = DynkinNumbering.slansky(algebra);
        int[] labels = new int[slansky.length];
        boolean same = true;
        for (int place = 0; place < slansky.length; place++) {
            labels[place] = irrep.label(slansky[place]);
            same &= slansky[place] == place;
        }
        return same ? irrep.toString() : irrep + " in Bourbaki's order, " + DominantWeight.of(labels) + " in Slansky's";
    }

    private static String diagram(List<Integer> rows) {
        boolean drawable = rows.size() <= LARGEST_DRAWING && (rows.isEmpty() || rows.get(0) <= LARGEST_DRAWING);
        return drawable ? YoungDiagrams.drawing(rows) : "rows " + YoungDiagrams.partition(rows);
    }

    private static Optional<Line> congruenceClass(SimpleAlgebra algebra, DominantWeight irrep) {
        CongruenceClass found = CongruenceClass.of(algebra, irrep);
        if (found.modulus() == 1) {
            return Optional.empty();
        }
        String value = found.paired() ? found.toString() : found + " mod " + found.modulus();
        return Optional.of(new Line(algebra.series() == Series.A ? "N-ality" : "congruence class", value));
    }

    /** The irrep whose values show the normalisation: fundamental, vector, or the smallest of an exceptional group. */
    private static DominantWeight smallest(LieGroup group) {
        int[] labels = new int[group.algebra().rank()];
        int node = switch (group.algebra().series()) {
            case A, B, C, D, G -> 0;
            case E -> group.algebra().rank() == 6 ? 0 : group.algebra().rank() - 1;
            case F -> 3;
        };
        labels[node] = group.family() == LieGroup.Family.SO && group.algebra().rank() == 1 ? 2 : 1;
        return DominantWeight.of(labels);
    }
}
