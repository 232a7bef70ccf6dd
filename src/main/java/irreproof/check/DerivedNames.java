package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Names;
import irreproof.check.judge.Undecidable;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.RepresentationRing;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.ReductiveRing;
import irreproof.naming.DimensionNames;
import irreproof.naming.IrrepLabel;
import irreproof.naming.LieGroup;
import irreproof.naming.ProductGroup;
import irreproof.naming.ProductGroup.Entries;
import irreproof.naming.YoungDiagrams;
import irreproof.notation.AuthorStyle;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import irreproof.notation.Writer;
import irreproof.notation.WrittenTerm;
import irreproof.notation.WrittenTerm.WrittenName;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** Writes sums of irreps of a product group in a chosen notation, the largest irreps first. */
final class DerivedNames {
    private final ProductGroup group;
    private final RepresentationRing<ReductiveIrrep> ring;
    private final DerivedNotation notation;
    private final Entries entries;
    private final AuthorStyle style;
    private final Budget budget;

    /** @param entries how numbers are meant where the notation is by dimension */
    DerivedNames(ProductGroup group, DerivedNotation notation, Entries entries, AuthorStyle style, Budget budget) {
        this.group = group;
        this.ring = new ReductiveRing(group.algebra());
        this.notation = notation;
        this.entries = entries;
        this.style = style;
        this.budget = budget;
    }

    /** The notation that an author's entry shows. */
    static DerivedNotation of(Name entry) {
        return entry instanceof ListName
                ? DerivedNotation.DYNKIN
                : entry instanceof DiagramName ? DerivedNotation.YOUNG : DerivedNotation.DIMENSION;
    }

    /** The author's style, where the side's first name shows how such names are written; a list of labels shows no tuple. */
    static AuthorStyle style(String typed, Statement bare, DerivedNotation notation) {
        Name sample = Names.of(bare.sides().get(0)).get(0);
        return of(sample) == notation && !(sample instanceof ListName)
                ? AuthorStyle.learn(typed, List.of(bare))
                : AuthorStyle.standard();
    }

    /** @throws Undecidable if Young diagrams are asked of a group other than SU(n) */
    String sum(Decomposition<ReductiveIrrep> sum) {
        if (sum.isZero()) {
            return "0";
        }
        List<WrittenTerm> terms = sum.multiplicities().keySet().stream()
                .sorted(Comparator.comparing((ReductiveIrrep irrep) -> ring.dimension(irrep))
                        .reversed()
                        .thenComparing(this::bySingleFactors)
                        .thenComparing(Comparator.naturalOrder()))
                .map(irrep -> new WrittenTerm(BigInteger.valueOf(sum.multiplicity(irrep)), name(irrep)))
                .toList();
        return Writer.sum(terms, style);
    }

    /** The one with the larger first factor that differs in dimension comes first. */
    private int bySingleFactors(ReductiveIrrep left, ReductiveIrrep right) {
        for (int i = 0; i < left.weights().size(); i++) {
            LieRing factor = new LieRing(group.factors().get(i).algebra());
            int order = factor.dimension(right.weights().get(i))
                    .compareTo(factor.dimension(left.weights().get(i)));
            if (order != 0) {
                return order;
            }
        }
        return 0;
    }

    private WrittenName name(ReductiveIrrep irrep) {
        List<WrittenName> names = new ArrayList<>();
        for (int i = 0; i < irrep.weights().size(); i++) {
            names.add(name(group.factors().get(i), irrep.weights().get(i), notation));
        }
        if (names.isEmpty()) {
            names.add(new WrittenTerm.Dimension(BigInteger.ONE, 0, 0, ""));
        }
        return new WrittenTerm.Tuple(
                names, irrep.charges().stream().map(Rational::toString).toList());
    }

    private WrittenName name(LieGroup factor, DominantWeight irrep, DerivedNotation chosen) {
        return switch (chosen) {
            case AUTHOR, DIMENSION ->
                entries == Entries.SPINS && factor.algebra().rank() == 1
                        ? new WrittenTerm.Spin(irrep.label(0))
                        : dimension(factor, irrep);
            case DYNKIN -> labels(irrep);
            case YOUNG -> {
                if (factor.family() != LieGroup.Family.SU) {
                    throw new Undecidable("irreps of " + factor.display() + " are not named by Young diagrams here");
                }
                yield new WrittenTerm.Diagram(YoungDiagrams.rows(irrep));
            }
        };
    }

    private static WrittenName labels(DominantWeight irrep) {
        return new WrittenTerm.Labels(Arrays.stream(irrep.labels()).boxed().toList());
    }

    /** By Dynkin labels where the name is too long a search. */
    private WrittenName dimension(LieGroup factor, DominantWeight irrep) {
        try {
            IrrepLabel label = new DimensionNames(factor).labelOf(irrep, budget.withSteps(Wording.STEPS));
            return new WrittenTerm.Dimension(label.dimension(), label.barred() ? 1 : 0, label.primes(), label.suffix());
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
            return labels(irrep);
        }
    }
}
