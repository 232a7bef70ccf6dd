package irreproof.naming;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.naming.ProductGroup.Entries;
import irreproof.notation.Expression;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The names of a product group's irreps, both ways: a dimension name (or spin, Dynkin labels, Young diagram) for each
 * simple factor, a charge for each U(1). Every method throws {@link irreproof.budget.BudgetExceeded} when a factor's
 * names are too large a search.
 */
public final class ProductNames {
    /** As many meanings of one tuple are ever returned. */
    private static final int MOST = 64;

    private final ProductGroup group;
    private final List<DimensionNames> names;

    public ProductNames(ProductGroup group) {
        this.group = group;
        this.names = group.factors().stream().map(DimensionNames::new).toList();
    }

    public ProductGroup group() {
        return group;
    }

    /** The name in the published tables. */
    public ProductLabel labelOf(ReductiveIrrep irrep, Budget budget) {
        List<IrrepLabel> labels = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            labels.add(names.get(i).labelOf(irrep.weights().get(i), budget));
        }
        return new ProductLabel(labels, irrep.charges());
    }

    /**
     * What a tuple can denote, the most usual meaning first. A bar over an entry conjugates it; a bar over the whole tuple
     * is left to the caller.
     *
     * @param entries what bare numbers stand for
     * @return empty if one of the entries has no meaning
     */
    public List<ProductCandidate> candidates(WrittenTuple tuple, Entries entries, Budget budget) {
        List<Partial> partial = List.of(new Partial(List.of(), 0));
        for (int i = 0; i < names.size(); i++) {
            List<Candidate> factor = entry(i, tuple.entries().get(i), entries, budget);
            List<Partial> longer = new ArrayList<>();
            for (Partial start : partial) {
                factor.forEach(candidate -> longer.add(start.with(candidate)));
            }
            longer.sort(Comparator.comparingInt(Partial::unusual));
            partial = longer.subList(0, Math.min(MOST, longer.size()));
        }
        return partial.stream()
                .map(found -> new ProductCandidate(value(found.weights(), tuple), found.unusual()))
                .toList();
    }

    private record Partial(List<DominantWeight> weights, int unusual) {
        Partial with(Candidate candidate) {
            List<DominantWeight> longer = new ArrayList<>(weights);
            longer.add(candidate.irrep());
            return new Partial(longer, unusual + candidate.custom().ordinal());
        }
    }

    private static Decomposition<ReductiveIrrep> value(List<DominantWeight> weights, WrittenTuple tuple) {
        Decomposition<ReductiveIrrep> value = Decomposition.of(new ReductiveIrrep(weights, tuple.charges()));
        if (!tuple.bothSigns()) {
            return value;
        }
        List<Rational> negative = tuple.charges().stream().map(Rational::negate).toList();
        return value.plus(Decomposition.of(new ReductiveIrrep(weights, negative)));
    }

    private List<Candidate> entry(int factor, Name entry, Entries entries, Budget budget) {
        LieGroup simple = group.factors().get(factor);
        int bars = entry.decoration().bars();
        if (entry instanceof NumberName number) {
            boolean spin = entries == Entries.SPINS && simple.algebra().rank() == 1;
            if (spin) {
                return Spins.irrep(number.numerator(), number.denominator()).stream()
                        .map(irrep -> new Candidate(irrep, Custom.TABLES))
                        .toList();
            }
            String suffix = number.decoration().label();
            return number.denominator() != 1
                    ? List.of()
                    : names.get(factor)
                            .candidates(
                                    number.numerator(),
                                    bars,
                                    number.decoration().primes(),
                                    suffix,
                                    budget);
        }
        List<Candidate> plain =
                entry instanceof ListName list ? labels(simple, list) : diagram(simple, (DiagramName) entry);
        return bars % 2 == 0
                ? plain
                : plain.stream()
                        .map(candidate -> new Candidate(
                                Conjugation.conjugate(simple.algebra(), candidate.irrep()), candidate.custom()))
                        .toList();
    }

    private static List<Candidate> labels(LieGroup group, ListName list) {
        int[] labels = new int[list.entries().size()];
        for (int i = 0; i < labels.length; i++) {
            Expression entry = list.entries().get(i);
            boolean label = entry instanceof NumberName number
                    && number.denominator() == 1
                    && number.numerator().bitLength() < 31;
            if (!label) {
                return List.of();
            }
            labels[i] = ((NumberName) entry).numerator().intValue();
        }
        return DynkinNumbering.candidates(group, labels);
    }

    private static List<Candidate> diagram(LieGroup group, DiagramName diagram) {
        if (diagram.rows().isEmpty()) {
            return List.of(
                    new Candidate(DominantWeight.of(new int[group.algebra().rank()]), Custom.TABLES));
        }
        return YoungDiagrams.irrep(group, diagram.rows()).stream()
                .map(irrep -> new Candidate(irrep, Custom.TABLES))
                .toList();
    }
}
