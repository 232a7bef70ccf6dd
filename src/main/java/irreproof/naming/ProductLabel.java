package irreproof.naming;

import irreproof.engine.Rational;
import java.util.List;
import java.util.stream.Collectors;

/**
 * The conventional name of an irrep of a product group: {@code (3,\bar{2})_{1/6}}.
 *
 * @param factors a dimension name for each simple factor, in the group's order
 * @param charges one for each U(1), in the group's order
 */
public record ProductLabel(List<IrrepLabel> factors, List<Rational> charges) {
    public ProductLabel {
        factors = List.copyOf(factors);
        charges = List.copyOf(charges);
    }

    /** Plain text for logs and tests: {@code (3,~2)_1/6}, {@code 16_-1}. */
    @Override
    public String toString() {
        String names = factors.stream().map(IrrepLabel::toString).collect(Collectors.joining(","));
        String behind = charges.stream().map(Rational::toString).collect(Collectors.joining(","));
        return (factors.size() == 1 ? names : "(" + names + ")") + (charges.isEmpty() ? "" : "_" + behind);
    }
}
