package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import irreproof.engine.Rational;
import irreproof.engine.RepresentationRing;
import irreproof.engine.SchurFunctor;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.IntFunction;

/**
 * The representation ring of a reductive algebra, an outer product of those of its simple factors ({@link LieRing}), with
 * charges that add up. Powers by {@link SchurFunctor}: Adams operations act on each factor by itself. Cost: that of the factors, times the terms of the result.
 */
public record ReductiveRing(ReductiveAlgebra algebra) implements RepresentationRing<ReductiveIrrep> {
    @Override
    public ReductiveIrrep trivial() {
        List<DominantWeight> weights = algebra.factors().stream()
                .map(factor -> new LieRing(factor).trivial())
                .toList();
        return new ReductiveIrrep(weights, noCharges());
    }

    private List<Rational> noCharges() {
        List<Rational> charges = new ArrayList<>();
        for (int i = 0; i < algebra.charges(); i++) {
            charges.add(Rational.ZERO);
        }
        return charges;
    }

    /** @throws IllegalArgumentException if the irrep belongs to another algebra */
    void require(ReductiveIrrep irrep) {
        if (irrep.weights().size() != algebra.factors().size()
                || irrep.charges().size() != algebra.charges()) {
            throw new IllegalArgumentException(irrep + " is no irrep of " + algebra);
        }
        for (int i = 0; i < irrep.weights().size(); i++) {
            algebra.factors().get(i).requireWeight(irrep.weights().get(i));
        }
    }

    @Override
    public BigInteger dimension(ReductiveIrrep irrep) {
        require(irrep);
        BigInteger dimension = BigInteger.ONE;
        for (int i = 0; i < irrep.weights().size(); i++) {
            dimension = dimension.multiply(ring(i).dimension(irrep.weights().get(i)));
        }
        return dimension;
    }

    private LieRing ring(int factor) {
        return new LieRing(algebra.factors().get(factor));
    }

    /** The dual irrep of each factor; charges change sign. */
    @Override
    public ReductiveIrrep conjugate(ReductiveIrrep irrep) {
        require(irrep);
        List<DominantWeight> weights = new ArrayList<>();
        for (int i = 0; i < irrep.weights().size(); i++) {
            weights.add(ring(i).conjugate(irrep.weights().get(i)));
        }
        return new ReductiveIrrep(
                weights, irrep.charges().stream().map(Rational::negate).toList());
    }

    @Override
    public Decomposition<ReductiveIrrep> product(ReductiveIrrep left, ReductiveIrrep right, Budget budget) {
        require(left);
        require(right);
        return outer(
                i -> ring(i).product(left.weights().get(i), right.weights().get(i), budget),
                sum(left.charges(), 1, right.charges()),
                budget);
    }

    /** The outer product of one sum for each factor, all with the same charges. */
    Decomposition<ReductiveIrrep> outer(
            IntFunction<Decomposition<DominantWeight>> sums, List<Rational> charges, Budget budget) {
        Decomposition<ReductiveIrrep> result = Decomposition.of(new ReductiveIrrep(List.of(), charges));
        for (int i = 0; i < algebra.factors().size(); i++) {
            result = append(result, sums.apply(i), budget);
        }
        return result;
    }

    private static Decomposition<ReductiveIrrep> append(
            Decomposition<ReductiveIrrep> sum, Decomposition<DominantWeight> factor, Budget budget) {
        BigInteger terms = BigInteger.valueOf(sum.multiplicities().size())
                .multiply(BigInteger.valueOf(factor.multiplicities().size()));
        budget.require(terms, "a product with " + terms + " terms");
        Map<ReductiveIrrep, Long> result = new HashMap<>();
        sum.multiplicities()
                .forEach((irrep, count) -> factor.multiplicities().forEach((weight, times) -> {
                    budget.spend(1);
                    List<DominantWeight> weights = new ArrayList<>(irrep.weights());
                    weights.add(weight);
                    result.put(new ReductiveIrrep(weights, irrep.charges()), Math.multiplyExact(count, times));
                }));
        return Decomposition.of(result);
    }

    private static List<Rational> sum(List<Rational> left, long factor, List<Rational> right) {
        List<Rational> sum = new ArrayList<>();
        for (int i = 0; i < left.size(); i++) {
            sum.add(right.get(i).times(Rational.of(factor)).plus(left.get(i)));
        }
        return sum;
    }

    @Override
    public Decomposition<ReductiveIrrep> symmetricPower(ReductiveIrrep irrep, int exponent, Budget budget) {
        require(irrep);
        return power(irrep, false, exponent, budget);
    }

    /** Beyond half the dimension by duality: the top exterior power has the charges times the dimension. */
    @Override
    public Decomposition<ReductiveIrrep> exteriorPower(ReductiveIrrep irrep, int exponent, Budget budget) {
        BigInteger dimension = dimension(irrep);
        BigInteger rest = dimension.subtract(BigInteger.valueOf(exponent));
        if (rest.signum() < 0) {
            return Decomposition.zero();
        }
        if (rest.compareTo(BigInteger.valueOf(exponent)) >= 0) {
            return power(irrep, true, exponent, budget);
        }
        ReductiveIrrep top =
                new ReductiveIrrep(trivial().weights(), sum(noCharges(), dimension.longValueExact(), irrep.charges()));
        return product(power(conjugate(irrep), true, rest.intValueExact(), budget), Decomposition.of(top), budget);
    }

    private Decomposition<ReductiveIrrep> power(ReductiveIrrep irrep, boolean exterior, int exponent, Budget budget) {
        if (exponent < 0) {
            throw new IllegalArgumentException("negative exponent " + exponent);
        }
        SchurFunctor.requireBoxes(exponent, budget);
        Partition diagram = exterior ? Partition.column(exponent) : Partition.of(exponent);
        return schurFunctor(irrep, diagram, budget);
    }

    @Override
    public Decomposition<ReductiveIrrep> adamsProduct(
            ReductiveIrrep irrep, int power, Decomposition<ReductiveIrrep> factor, Budget budget) {
        require(irrep);
        Decomposition<ReductiveIrrep> total = Decomposition.zero();
        for (var term : factor.multiplicities().entrySet()) {
            ReductiveIrrep other = term.getKey();
            Decomposition<ReductiveIrrep> product = outer(
                    i -> ring(i).adamsProduct(
                                    irrep.weights().get(i),
                                    power,
                                    Decomposition.of(other.weights().get(i)),
                                    budget),
                    sum(other.charges(), power, irrep.charges()),
                    budget);
            total = total.plus(product, term.getValue());
        }
        return total;
    }

    /** The classes of the factors that have a centre, then the charges: {@code (1,0; 1/3)}. */
    @Override
    public Optional<CentralCharacter> centralCharacter(ReductiveIrrep irrep) {
        require(irrep);
        Set<String> names = new LinkedHashSet<>();
        List<String> classes = new ArrayList<>();
        for (int i = 0; i < irrep.weights().size(); i++) {
            ring(i).centralCharacter(irrep.weights().get(i)).ifPresent(character -> {
                names.add(character.name());
                classes.add(character.value());
            });
        }
        List<String> charges = irrep.charges().stream().map(Rational::toString).toList();
        if (!charges.isEmpty()) {
            names.add("charge");
        }
        if (names.isEmpty()) {
            return Optional.empty();
        }
        String value = String.join(",", classes)
                + (classes.isEmpty() || charges.isEmpty() ? "" : "; ")
                + String.join(",", charges);
        return Optional.of(new CentralCharacter(
                String.join(" and ", names), classes.size() + charges.size() == 1 ? value : "(" + value + ")"));
    }
}
