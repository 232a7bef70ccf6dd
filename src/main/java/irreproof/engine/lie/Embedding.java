package irreproof.engine.lie;

import irreproof.engine.Rational;
import java.util.ArrayList;
import java.util.List;

/**
 * A reductive subalgebra of a simple Lie algebra, by the linear map of weights it induces: a weight with Dynkin labels w
 * (Bourbaki order) restricts to the labels P w, first those of the factors in their order, then the charges.
 *
 * @param projection the rows of P, {@code subalgebra.rank()} of them with {@code algebra.rank()} entries each; whole
 *     numbers in the rows of simple factors
 * @param name how it arises, in the trade's words: {@code regular, node 2 deleted}, {@code special, principal}
 */
public record Embedding(
        SimpleAlgebra algebra, ReductiveAlgebra subalgebra, List<List<Rational>> projection, String name) {
    public Embedding {
        projection = projection.stream().map(List::copyOf).toList();
        boolean fits = projection.size() == subalgebra.rank()
                && projection.stream().allMatch(row -> row.size() == algebra.rank());
        if (!fits) {
            throw new IllegalArgumentException(
                    "the projection of " + algebra + " to " + subalgebra + " has a wrong shape");
        }
    }

    /** The algebra in itself. */
    public static Embedding identity(SimpleAlgebra algebra) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < algebra.rank(); i++) {
            List<Rational> row = new ArrayList<>();
            for (int j = 0; j < algebra.rank(); j++) {
                row.add(i == j ? Rational.ONE : Rational.ZERO);
            }
            rows.add(row);
        }
        return new Embedding(algebra, ReductiveAlgebra.of(algebra), rows, "identity");
    }

    /** The rows of P that belong to a simple factor of the subalgebra, counted from 0. */
    public List<List<Rational>> rows(int factor) {
        int start = 0;
        for (int i = 0; i < factor; i++) {
            start += subalgebra.factors().get(i).rank();
        }
        return projection.subList(
                start, start + subalgebra.factors().get(factor).rank());
    }

    /** The rows of P that give the charges. */
    public List<List<Rational>> chargeRows() {
        return projection.subList(projection.size() - subalgebra.charges(), projection.size());
    }

    /**
     * The chain through a subalgebra of one simple factor: its factors replace that factor, its charges come after the
     * present ones.
     *
     * @throws IllegalArgumentException if the next embedding is not one into that factor
     */
    public Embedding then(int factor, Embedding next) {
        if (!subalgebra.factors().get(factor).equals(next.algebra)) {
            throw new IllegalArgumentException(next.name + " is no subalgebra of factor " + factor + " of " + name);
        }
        List<SimpleAlgebra> factors = new ArrayList<>();
        List<List<Rational>> simpleRows = new ArrayList<>();
        for (int i = 0; i < subalgebra.factors().size(); i++) {
            if (i == factor) {
                factors.addAll(next.subalgebra.factors());
                int simpleRank = next.projection.size() - next.subalgebra.charges();
                next.projection.subList(0, simpleRank).forEach(row -> simpleRows.add(combination(row, rows(factor))));
            } else {
                factors.add(subalgebra.factors().get(i));
                simpleRows.addAll(rows(i));
            }
        }
        simpleRows.addAll(chargeRows());
        next.chargeRows().forEach(row -> simpleRows.add(combination(row, rows(factor))));
        ReductiveAlgebra smaller = new ReductiveAlgebra(factors, subalgebra.charges() + next.subalgebra.charges());
        return new Embedding(algebra, smaller, simpleRows, name + ", then " + next.name);
    }

    /**
     * The diagonal subalgebra of two equal factors, in the place of the first; the second is not conjugated:
     * with (R, S) goes R x S.
     *
     * @throws IllegalArgumentException if the factors differ or are one
     */
    public Embedding diagonal(int first, int second) {
        List<SimpleAlgebra> factors = new ArrayList<>(subalgebra.factors());
        if (first == second || !factors.get(first).equals(factors.get(second))) {
            throw new IllegalArgumentException("no diagonal of factors " + first + " and " + second + " of " + name);
        }
        List<List<Rational>> rows = new ArrayList<>();
        for (int factor = 0; factor < factors.size(); factor++) {
            if (factor == first) {
                for (int i = 0; i < factors.get(first).rank(); i++) {
                    List<Rational> both = List.of(Rational.ONE, Rational.ONE);
                    rows.add(combination(
                            both, List.of(rows(first).get(i), rows(second).get(i))));
                }
            } else if (factor != second) {
                rows.addAll(rows(factor));
            }
        }
        rows.addAll(chargeRows());
        factors.remove(second);
        ReductiveAlgebra smaller = new ReductiveAlgebra(factors, subalgebra.charges());
        return new Embedding(algebra, smaller, rows, name + ", diagonal of factors " + first + " and " + second);
    }

    /**
     * The same factors with other charges, each a combination of the present ones.
     *
     * @param combinations a row of coefficients for each new charge
     */
    public Embedding recharged(List<List<Rational>> combinations) {
        List<List<Rational>> rows = new ArrayList<>(projection.subList(0, projection.size() - subalgebra.charges()));
        combinations.forEach(row -> rows.add(combination(row, chargeRows())));
        ReductiveAlgebra same = new ReductiveAlgebra(subalgebra.factors(), combinations.size());
        return new Embedding(algebra, same, rows, name);
    }

    /** The sum of the rows, each times its coefficient. */
    private static List<Rational> combination(List<Rational> coefficients, List<List<Rational>> rows) {
        List<Rational> sum = new ArrayList<>();
        for (int j = 0; j < rows.get(0).size(); j++) {
            Rational entry = Rational.ZERO;
            for (int i = 0; i < rows.size(); i++) {
                if (coefficients.get(i).signum() != 0 && rows.get(i).get(j).signum() != 0) {
                    entry = entry.plus(coefficients.get(i).times(rows.get(i).get(j)));
                }
            }
            sum.add(entry);
        }
        return sum;
    }
}
