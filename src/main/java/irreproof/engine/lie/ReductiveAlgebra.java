package irreproof.engine.lie;

import java.util.List;

/**
 * A product of simple Lie algebras and a number of u(1)s, in the order the author writes the factors; the u(1)s come last.
 *
 * @param factors the simple factors; may be empty
 * @param charges how many u(1)s
 */
public record ReductiveAlgebra(List<SimpleAlgebra> factors, int charges) {
    public ReductiveAlgebra {
        factors = List.copyOf(factors);
        if (charges < 0) {
            throw new IllegalArgumentException("a negative number of u(1)s");
        }
    }

    public static ReductiveAlgebra of(SimpleAlgebra algebra) {
        return new ReductiveAlgebra(List.of(algebra), 0);
    }

    /** The ranks of the factors and the number of u(1)s added up. */
    public int rank() {
        return charges + factors.stream().mapToInt(SimpleAlgebra::rank).sum();
    }

    /** {@code A2+A1+u1}. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        factors.forEach(factor -> text.append(text.isEmpty() ? "" : "+").append(factor));
        for (int i = 0; i < charges; i++) {
            text.append(text.isEmpty() ? "u1" : "+u1");
        }
        return text.toString();
    }
}
