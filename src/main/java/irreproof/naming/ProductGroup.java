package irreproof.naming;

import irreproof.engine.lie.ReductiveAlgebra;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * A product of simple groups and U(1)s, its parts in the author's order. Two are equal if their parts and their entries
 * agree, however they are printed.
 *
 * @param display as printed in messages: {@code SU(3)_C x SU(2)_L x U(1)_Y}
 * @param entries how its irreps are usually named
 */
public record ProductGroup(String display, List<Part> parts, Entries entries) {
    public ProductGroup {
        parts = List.copyOf(parts);
    }

    /** What a tuple has an entry for. */
    public sealed interface Part {}

    /** A simple factor. */
    public record Simple(LieGroup group) implements Part {}

    /** A U(1): a rational charge, in the author's normalisation. */
    public record Charge() implements Part {}

    /** How the entries of tuples are usually meant. */
    public enum Entries {
        /** {@code (\mathbf{3},\mathbf{2})_{1/6}}. */
        DIMENSIONS,
        /** {@code (1/2,0)}: the irreps of the Lorentz group. */
        SPINS
    }

    /** The simple factors in the author's order. */
    public List<LieGroup> factors() {
        List<LieGroup> factors = new ArrayList<>();
        for (Part part : parts) {
            if (part instanceof Simple simple) {
                factors.add(simple.group());
            }
        }
        return factors;
    }

    /** How many U(1)s there are. */
    public int charges() {
        return parts.size() - factors().size();
    }

    /** The simple factors in the author's order, then the U(1)s in theirs. */
    public ReductiveAlgebra algebra() {
        return new ReductiveAlgebra(factors().stream().map(LieGroup::algebra).toList(), charges());
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof ProductGroup that && entries == that.entries && parts.equals(that.parts);
    }

    @Override
    public int hashCode() {
        return Objects.hash(parts, entries);
    }
}
