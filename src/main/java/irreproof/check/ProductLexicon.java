package irreproof.check;

import irreproof.budget.Budget;
import irreproof.check.judge.Candidate;
import irreproof.check.judge.Interpretation;
import irreproof.check.judge.Interpretation.Diagrams;
import irreproof.check.judge.Interpretation.Lists;
import irreproof.check.judge.Interpretation.Numbers;
import irreproof.check.judge.Lexicon;
import irreproof.check.judge.NameKey;
import irreproof.check.judge.Undecidable;
import irreproof.engine.RepresentationRing;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.ReductiveRing;
import irreproof.naming.LieGroup;
import irreproof.naming.ProductGroup;
import irreproof.naming.ProductGroup.Entries;
import irreproof.naming.ProductNames;
import irreproof.naming.WrittenTuple;
import irreproof.notation.Expression;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Symmetry;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** The names of a product group: tuples with charges, each tuple read by itself. */
final class ProductLexicon implements Lexicon<ReductiveIrrep> {
    private final ProductGroup group;
    private final ProductNames names;
    private final ReductiveRing ring;

    ProductLexicon(ProductGroup group) {
        this.group = group;
        this.names = new ProductNames(group);
        this.ring = new ReductiveRing(group.algebra());
    }

    @Override
    public RepresentationRing<ReductiveIrrep> ring() {
        return ring;
    }

    /** Numbers are spins if one of them is 0 or a fraction, or in the Lorentz group; never if one is styled. */
    @Override
    public List<Interpretation> interpretations(Collection<Name> written) {
        boolean spin = false;
        boolean styled = false;
        for (Name name : written) {
            WrittenTuple tuple = WrittenTuple.of(name, group).orElseThrow(() -> new Undecidable(expected()));
            spin |= tuple.hasSpin();
            styled |= tuple.hasStyledEntry();
        }
        boolean spinGroup =
                group.factors().stream().allMatch(factor -> factor.algebra().rank() == 1);
        if (spin && !spinGroup) {
            throw new Undecidable("0 and fractions are not names of irreps of " + group.display());
        }
        List<Interpretation> senses = new ArrayList<>();
        if (spin || group.entries() == Entries.SPINS && !styled) {
            senses.add(sense(Numbers.SPIN));
        }
        if (!spin) {
            senses.add(sense(Numbers.DIMENSION));
        }
        return senses;
    }

    private static Interpretation sense(Numbers numbers) {
        return new Interpretation(numbers, Lists.DYNKIN_BOURBAKI, Diagrams.DEFINING);
    }

    /** The form that names have in this group. */
    private String expected() {
        int factors = group.factors().size();
        int charges = group.charges();
        String entries = factors == 0
                ? "1"
                : factors == 1 ? "a name" : "a bracket of " + factors + " names, one for each factor,";
        String behind = charges == 0
                ? " without a charge"
                : charges == 1 ? " with a charge, as in (\\ldots)_{1/6}" : " with " + charges + " charges";
        return "irreps of " + group.display() + " are written as " + entries + behind;
    }

    private WrittenTuple tuple(Name name) {
        return WrittenTuple.of(name, group).orElseThrow();
    }

    @Override
    public boolean isBarred(Name name) {
        return tuple(name).bars() % 2 == 1;
    }

    @Override
    public NameKey key(Name name, Interpretation interpretation) {
        WrittenTuple tuple = tuple(name);
        String entries = tuple.entries().stream().map(ProductLexicon::text).collect(Collectors.joining(","));
        return new NameKey("", 0, "(" + entries + ")" + tuple.charges() + (tuple.bothSigns() ? "±" : ""));
    }

    private static String text(Expression entry) {
        if (!(entry instanceof Name name)) {
            return entry.toString();
        }
        String marks = "~".repeat(name.decoration().bars() % 2)
                + "'".repeat(name.decoration().primes())
                + name.decoration().label();
        if (name instanceof NumberName number) {
            return number.numerator() + "/" + number.denominator() + marks;
        }
        return name instanceof ListName list
                ? list.entries().stream().map(ProductLexicon::text).collect(Collectors.joining(",", "[", "]")) + marks
                : ((DiagramName) name).rows() + marks;
    }

    @Override
    public List<Candidate<ReductiveIrrep>> candidates(Name name, Interpretation interpretation, Budget budget) {
        return names.candidates(tuple(name), entries(interpretation), budget).stream()
                .map(found -> new Candidate<>(found.value(), found.unusual()))
                .toList();
    }

    static Entries entries(Interpretation interpretation) {
        return switch (interpretation.numbers()) {
            case SPIN -> Entries.SPINS;
            case DIMENSION -> Entries.DIMENSIONS;
        };
    }

    @Override
    public Optional<String> doubt(Collection<Name> written) {
        boolean numbered = group.factors().stream().anyMatch(factor -> factor.family() == LieGroup.Family.EXCEPTIONAL)
                && written.stream()
                        .flatMap(name -> tuple(name).entries().stream())
                        .anyMatch(ListName.class::isInstance);
        return numbered
                ? Optional.of("authors number the nodes of exceptional groups in several ways")
                : Optional.empty();
    }

    @Override
    public Symmetry claimedPart(Name name) {
        return name.decoration().symmetry();
    }
}
