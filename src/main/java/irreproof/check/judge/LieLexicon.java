package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.check.judge.Interpretation.Diagrams;
import irreproof.check.judge.Interpretation.Lists;
import irreproof.check.judge.Interpretation.Numbers;
import irreproof.engine.Decomposition;
import irreproof.engine.RepresentationRing;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.WeylDimension;
import irreproof.naming.Custom;
import irreproof.naming.DimensionNames;
import irreproof.naming.LieGroup;
import irreproof.naming.Spins;
import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Symmetry;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** The names of one simple Lie group: dimension names, Dynkin labels, Young diagrams of SU(n), spins of SU(2). */
public final class LieLexicon implements Lexicon<DominantWeight> {
    private final LieGroup group;
    private final LieRing ring;
    private final DimensionNames dimensionNames;
    private final DeclaredNames declared;

    public LieLexicon(LieGroup group, DeclaredNames declared) {
        this.group = group;
        this.ring = new LieRing(group.algebra());
        this.dimensionNames = new DimensionNames(group);
        this.declared = declared;
    }

    public LieGroup group() {
        return group;
    }

    public DimensionNames dimensionNames() {
        return dimensionNames;
    }

    @Override
    public RepresentationRing<DominantWeight> ring() {
        return ring;
    }

    @Override
    public List<Interpretation> interpretations(Collection<Name> names) {
        boolean charged = names.stream()
                .flatMap(name -> name.decoration().charges().stream())
                .anyMatch(charge -> charge.matches("[+-].*|.*/.*"));
        if (charged) {
            throw new Undecidable("irreps of product groups and charges are not judged yet");
        }
        List<Interpretation> result = new ArrayList<>();
        for (Numbers numbers : numberSenses(names)) {
            for (Lists lists : listSenses(names)) {
                for (Diagrams diagrams : diagramSenses(names)) {
                    result.add(new Interpretation(numbers, lists, diagrams));
                }
            }
        }
        return result;
    }

    private Set<Numbers> numberSenses(Collection<Name> names) {
        Set<Numbers> senses = EnumSet.of(Numbers.DIMENSION);
        if (isSpinGroup()) {
            senses.add(Numbers.SPIN);
        }
        for (Name name : names) {
            if (name instanceof NumberName number
                    && (number.denominator() != 1 || number.numerator().signum() == 0)) {
                senses.remove(Numbers.DIMENSION);
            }
        }
        if (senses.isEmpty()) {
            throw Undecidable.otherGroup("0 and fractions are not names of irreps of " + group.display());
        }
        return senses;
    }

    private boolean isSpinGroup() {
        return group.algebra().rank() == 1;
    }

    private Set<Lists> listSenses(Collection<Name> names) {
        Set<Lists> senses = EnumSet.allOf(Lists.class);
        boolean any = false;
        for (Name name : names) {
            if (name instanceof ListName list) {
                any = true;
                senses.removeIf(sense -> sense == Lists.GROUPED
                        ? BracketNames.grouped(list).isEmpty() || list.bracket() == Bracket.SQUARE && !isSpinGroup()
                        : BracketNames.value(list, sense, group).isEmpty());
                if (!list.decoration().charges().isEmpty() || BracketNames.isTuple(list)) {
                    throw new Undecidable("irreps of product groups and charges are not judged yet");
                }
                if (senses.isEmpty()) {
                    throw Undecidable.otherGroup("a list of " + list.entries().size()
                            + " entries does not name an irrep of " + group.display());
                }
            }
        }
        return any ? senses : EnumSet.of(Lists.DYNKIN_BOURBAKI);
    }

    private Set<Diagrams> diagramSenses(Collection<Name> names) {
        boolean any = names.stream()
                .anyMatch(name ->
                        name instanceof DiagramName diagram && !diagram.rows().isEmpty());
        if (!any) {
            return EnumSet.of(Diagrams.DEFINING);
        }
        if (group.family() != LieGroup.Family.SU) {
            throw new Undecidable("Young diagrams of " + group.display() + " are not judged yet");
        }
        return isSpinGroup() ? EnumSet.of(Diagrams.DEFINING) : EnumSet.allOf(Diagrams.class);
    }

    @Override
    public NameKey key(Name name, Interpretation interpretation) {
        if (name instanceof NumberName number) {
            String fraction = number.denominator() == 1 ? "" : "/" + number.denominator();
            String dimension = number.numerator() + fraction;
            boolean spin = interpretation.numbers() == Numbers.SPIN;
            int primes = number.decoration().primes();
            String written = dimension + "'".repeat(primes) + suffix(number);
            return new NameKey(spin ? "" : dimension, primes, written, spin ? "" : mark(number));
        }
        if (name instanceof ListName list && interpretation.lists() == Lists.GROUPED) {
            return key(BracketNames.grouped(list).orElseThrow(), interpretation);
        }
        if (name instanceof ListName list) {
            return new NameKey("", 0, BracketNames.text(list));
        }
        return new NameKey("", 0, "diagram " + ((DiagramName) name).rows());
    }

    /** Any other mark, by which an author may tell irreps of one dimension apart, as in 20_S and 20_M. */
    private String mark(NumberName name) {
        String label = suffix(name).isEmpty() ? name.decoration().label() : "";
        String part = name.decoration().symmetry() == null
                ? ""
                : name.decoration().symmetry().name();
        return label
                + part
                + name.decoration().other()
                + String.join(",", name.decoration().charges());
    }

    /** A subscript that is part of the name: those of SO(8) and of chiral spinors; elsewhere a mere label. */
    private String suffix(NumberName name) {
        return group.algebra().series() == Series.D ? name.decoration().label() : "";
    }

    @Override
    public List<Candidate<DominantWeight>> candidates(Name name, Interpretation interpretation, Budget budget) {
        if (name instanceof NumberName number) {
            return interpretation.numbers() == Numbers.SPIN ? spin(number) : dimension(number, budget);
        }
        if (name instanceof ListName list && interpretation.lists() == Lists.GROUPED) {
            return candidates(BracketNames.grouped(list).orElseThrow(), interpretation, budget);
        }
        Optional<Decomposition<DominantWeight>> value = name instanceof ListName list
                ? BracketNames.value(list, interpretation.lists(), group)
                : diagram((DiagramName) name, interpretation.diagrams());
        return value.map(sum -> List.of(new Candidate<>(sum, 0))).orElse(List.of());
    }

    private static List<Candidate<DominantWeight>> spin(NumberName number) {
        return Spins.irrep(number.numerator(), number.denominator()).stream()
                .map(irrep -> new Candidate<>(Decomposition.of(irrep), 0))
                .toList();
    }

    private List<Candidate<DominantWeight>> dimension(NumberName number, Budget budget) {
        int primes = number.decoration().primes();
        Optional<DominantWeight> meaning = declared.meaning(number, group);
        if (meaning.isPresent()) {
            return List.of(new Candidate<>(Decomposition.of(meaning.get()), 0));
        }
        if (primes > 0
                && dimensionNames.countOf(number.numerator(), budget) <= primes
                && number.numerator().signum() > 0) {
            int namesakes = dimensionNames.countOf(number.numerator(), budget);
            if (namesakes > 0) {
                throw Undecidable.otherGroup(group.display() + " has too few irreps of dimension " + number.numerator()
                        + " for so many primes");
            }
        }
        List<Candidate<DominantWeight>> result = new ArrayList<>();
        for (var candidate : dimensionNames.candidates(number.numerator(), 0, primes, suffix(number), budget)) {
            int unusual = candidate.custom().ordinal();
            if (candidate.custom() == Custom.TABLES || !FixedNames.excludes(group, candidate.irrep())) {
                result.add(new Candidate<>(Decomposition.of(candidate.irrep()), unusual));
            }
        }
        return result;
    }

    private Optional<Decomposition<DominantWeight>> diagram(DiagramName diagram, Diagrams sense) {
        if (diagram.rows().isEmpty()) {
            return Optional.of(Decomposition.of(ring.trivial()));
        }
        return BracketNames.diagram(diagram.rows(), group)
                .map(sum -> sense == Diagrams.DEFINING ? sum : conjugate(sum));
    }

    private Decomposition<DominantWeight> conjugate(Decomposition<DominantWeight> sum) {
        return Decomposition.sum(sum.multiplicities().keySet().stream()
                .map(irrep -> Conjugation.conjugate(group.algebra(), irrep))
                .toList());
    }

    @Override
    public Optional<String> doubt(Collection<Name> names) {
        boolean marked = names.stream()
                .anyMatch(name -> name instanceof NumberName number
                        && suffix(number).isEmpty()
                        && (!name.decoration().other().isEmpty()
                                || name.decoration().label().equals("c")));
        if (marked) {
            return Optional.of("a superscript or subscript of a name is not understood");
        }
        boolean numbered =
                group.family() == LieGroup.Family.EXCEPTIONAL && names.stream().anyMatch(ListName.class::isInstance);
        return numbered
                ? Optional.of("authors number the nodes of " + group.display() + " in several ways")
                : Optional.empty();
    }

    @Override
    public Symmetry claimedPart(Name name) {
        if (name.decoration().symmetry() != null) {
            return name.decoration().symmetry();
        }
        boolean labelIsName =
                group.algebra().series() == Series.D && group.algebra().rank() == 4;
        return switch (labelIsName ? "" : name.decoration().label().toLowerCase(Locale.ROOT)) {
            case "s" -> Symmetry.SYMMETRIC;
            case "a" -> Symmetry.ANTISYMMETRIC;
            default -> null;
        };
    }

    @Override
    public boolean isBarred(Name name) {
        int inner = name instanceof ListName list
                ? BracketNames.grouped(list)
                        .map(entry -> entry.decoration().bars())
                        .orElse(0)
                : 0;
        return (name.decoration().bars() + inner) % 2 == 1;
    }

    /** The dimension of an irrep, exactly. */
    public BigInteger dimension(DominantWeight irrep) {
        return WeylDimension.dimension(group.algebra(), irrep);
    }
}
