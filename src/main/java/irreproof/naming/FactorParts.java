package irreproof.naming;

import irreproof.naming.ProductGroup.Charge;
import irreproof.naming.ProductGroup.Entries;
import irreproof.naming.ProductGroup.Part;
import irreproof.naming.ProductGroup.Simple;
import irreproof.notation.GroupName.Factor;
import java.util.List;

/**
 * The simple parts and U(1)s that one written factor consists of, by its complex algebra: U(n) and GL(n) are SU(n) and a
 * U(1), SO(4) two SU(2)s, SO(2) a U(1), SL(2,C) and SO(1,3) two SU(2)s whose irreps go by pairs of spins. O(n) is read as
 * SO(n), and its display says so.
 *
 * @param display the factor as printed in messages
 * @param parts none if the factor is not a Lie group known here
 * @param entries how its irreps are usually named
 * @param reason why there are no parts; empty otherwise
 */
record FactorParts(String display, List<Part> parts, Entries entries, String reason) {
    static FactorParts of(Factor factor, SymplecticUsage usage) {
        String shown = Groups.display(factor, false);
        if (!Groups.isLieFamily(factor)) {
            String reason = Groups.whyNot(factor);
            return none(shown, reason == null ? shown + " is not a group known here" : reason);
        }
        if (Groups.isFullOrthogonal(factor)) {
            return fullOrthogonal(factor, usage);
        }
        if (factor.arguments().isEmpty()) {
            return none(shown, shown + " with a symbol for its size is not judged yet");
        }
        if (Groups.isTooLarge(factor)) {
            return none(shown, Groups.tooLarge(factor));
        }
        int size = Groups.size(factor.arguments()).intValueExact();
        boolean lorentz = Groups.kind(factor).equals("SL") && factor.suffix().equals("C") && size == 2
                || Groups.kind(factor).equals("SO") && isLorentz(factor.arguments());
        if (lorentz) {
            return new FactorParts(shown, twoSpins(), Entries.SPINS, "");
        }
        if (Groups.isOrthogonal(factor) && size == 4) {
            return some(shown, twoSpins());
        }
        if (Groups.isOrthogonal(factor) && size == 2) {
            return some(shown, List.of(new Charge()));
        }
        if (Groups.kind(factor).equals("U") || Groups.kind(factor).equals("GL")) {
            return unitary(shown, factor.suffix().equals("H") ? 2 * size : size);
        }
        LieGroup group = Groups.simple(factor, usage).orElse(null);
        if (group == null) {
            return none(shown, shown + " is not a group known here");
        }
        return group.algebra().rank() > Groups.LARGEST_RANK
                ? none(shown, Groups.tooLarge(factor))
                : some(shown, List.of(new Simple(group.displayed(shown))));
    }

    private static FactorParts unitary(String shown, int size) {
        if (size < 1) {
            return none(shown, shown + " is not a group known here");
        }
        return size == 1
                ? some(shown, List.of(new Charge()))
                : some(shown, List.of(new Simple(LieGroup.su(size)), new Charge()));
    }

    /** O(2) has irreps of dimension 2, which SO(2) has not; from O(3) on most irreps of SO(n) are parts of O(n)'s. */
    private static FactorParts fullOrthogonal(Factor factor, SymplecticUsage usage) {
        String shown = Groups.display(factor, false);
        if (Groups.size(factor.arguments()).intValue() < 3) {
            return none(shown, shown + " is not connected, and such groups are not judged yet");
        }
        Factor connected = new Factor("SO", factor.arguments(), factor.suffix(), factor.label(), factor.algebra());
        FactorParts parts = of(connected, usage);
        return new FactorParts(
                shown + ", read as " + Groups.display(connected, false),
                parts.parts(),
                parts.entries(),
                parts.reason());
    }

    private static boolean isLorentz(List<Integer> arguments) {
        return arguments.equals(List.of(1, 3)) || arguments.equals(List.of(3, 1));
    }

    private static List<Part> twoSpins() {
        return List.of(new Simple(LieGroup.su(2)), new Simple(LieGroup.su(2)));
    }

    private static FactorParts some(String shown, List<Part> parts) {
        return new FactorParts(shown, parts, Entries.DIMENSIONS, "");
    }

    private static FactorParts none(String shown, String reason) {
        return new FactorParts(shown, List.of(), Entries.DIMENSIONS, reason);
    }
}
