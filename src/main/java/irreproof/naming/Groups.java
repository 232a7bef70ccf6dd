package irreproof.naming;

import irreproof.engine.lie.Series;
import irreproof.notation.GroupName;
import irreproof.notation.GroupName.Factor;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * From a group's written name to the group whose irreps a statement is about. Real forms and covers share the complex
 * algebra, and so the irreps: SU(p,q) and SL(n) are read as SU(n), Spin(n) and SO(p,q) as SO(n), USp(2n) as Sp(2n).
 *
 * <p>Conventions: Sp(n) and sp(n) with even n count the size of the matrices (Sp(4) has rank 2); with odd n they can
 * only count the rank. Sp(p,q) always counts the rank, USp(p,q) the size. A letter from A to D with a subscript is a
 * finite or point group, never a Cartan type; E6, E7, E8, F4 and G2 are Lie groups.
 */
public final class Groups {
    /** What the root systems of the engine hold. */
    static final int LARGEST_RANK = 128;

    private Groups() {}

    public static Resolution resolve(GroupName name) {
        if (name.factors().size() != 1) {
            return unsupported(name, "product groups are not judged yet");
        }
        Factor factor = name.factors().get(0);
        String reason = whyNot(factor);
        if (reason != null) {
            return unsupported(name, reason);
        }
        Optional<LieGroup> group = simple(factor, SymplecticUsage.SIZE);
        if (group.isEmpty()) {
            return unsupported(name, display(factor, false) + " is not a group known here");
        }
        if (group.get().algebra().rank() > LARGEST_RANK) {
            return unsupported(name, tooLarge(factor));
        }
        return new Resolution.Simple(group.get().displayed(display(factor, false)));
    }

    /**
     * Like {@link #resolve}, and products, U(n), SO(4), SO(2), the Lorentz group and O(n) too: {@link FactorParts} says
     * how. One simple factor gives a {@link Resolution.Simple}, anything else a {@link Resolution.Product}.
     *
     * @param usage what the author counts by the n of Sp(n), where the name itself does not tell
     */
    public static Resolution resolveFully(GroupName name, SymplecticUsage usage) {
        List<ProductGroup.Part> parts = new ArrayList<>();
        ProductGroup.Entries entries = ProductGroup.Entries.SPINS;
        List<String> displays = new ArrayList<>();
        for (Factor factor : name.factors()) {
            FactorParts found = FactorParts.of(factor, usage.with(name));
            if (found.parts().isEmpty()) {
                return new Resolution.Unsupported(display(name), found.reason());
            }
            parts.addAll(found.parts());
            entries = found.entries() == ProductGroup.Entries.SPINS ? entries : found.entries();
            displays.add(
                    isFullOrthogonal(factor)
                            ? found.display()
                            : display(factor, name.factors().size() > 1));
        }
        String display = String.join(" x ", displays);
        if (parts.size() == 1 && parts.get(0) instanceof ProductGroup.Simple simple) {
            return new Resolution.Simple(simple.group().displayed(display));
        }
        return new Resolution.Product(new ProductGroup(display, parts, entries));
    }

    /** Plain text: {@code SU(3)_C x SU(2)_L x U(1)_Y}, {@code so(1,9)}, {@code E6}, {@code D3h}. */
    public static String display(GroupName name) {
        return name.factors().stream().map(factor -> display(factor, true)).collect(Collectors.joining(" x "));
    }

    private static Resolution unsupported(GroupName name, String reason) {
        return new Resolution.Unsupported(display(name), reason);
    }

    static String display(Factor factor, boolean asWritten) {
        String family = asWritten && factor.algebra() ? kind(factor).toLowerCase(Locale.ROOT) : factor.family();
        String arguments = factor.arguments().stream().map(String::valueOf).collect(Collectors.joining(","));
        String label = asWritten && !factor.label().isEmpty() ? "_" + factor.label() : "";
        boolean subscripted = factor.family().matches("[A-TV-Z]") && !isFullOrthogonal(factor);
        if (subscripted) {
            return family + arguments + factor.suffix() + label;
        }
        String field = factor.suffix().isEmpty() ? "" : "," + factor.suffix();
        if (factor.arguments().isEmpty()) {
            String size = factor.suffix().isEmpty() ? "(n)" : factor.suffix();
            return family + (isClassical(factor) ? size : factor.suffix()) + label;
        }
        return family + "(" + arguments + field + ")" + label;
    }

    /** One whose size was written as a symbol if it has no arguments. */
    private static boolean isClassical(Factor factor) {
        return kind(factor).matches("SU|SL|SO|SPIN|SP|USP|GL");
    }

    /** O(n), as against the octahedral groups O and O_h. */
    static boolean isFullOrthogonal(Factor factor) {
        return factor.family().equals("O") && !factor.arguments().isEmpty();
    }

    /** Why statements about the factor are not judged; null if they may be. */
    static String whyNot(Factor factor) {
        String shown = display(factor, false);
        List<Integer> arguments = factor.arguments();
        switch (kind(factor)) {
            case "SU", "SL", "SO", "SPIN", "SP", "USP" -> {
                if (arguments.isEmpty()) {
                    return shown + " with a symbol for its size is not judged yet";
                }
            }
            case "U", "GL" -> {
                return shown + " has a U(1) factor, and charges are not judged yet";
            }
            case "O" -> {
                return arguments.isEmpty()
                        ? "point groups are not judged yet"
                        : shown + " is not connected, and such groups are not judged yet";
            }
            case "A", "B", "C", "D", "S", "T", "I", "Z", "Q" -> {
                return shown + " is read as a finite or point group, and those are not judged yet";
            }
            default -> {
                return null;
            }
        }
        BigInteger size = size(arguments);
        if (kind(factor).equals("SL") && factor.suffix().equals("C") && size.equals(BigInteger.TWO)) {
            return "irreps of SL(2,C) are pairs of spins, and those are not judged yet";
        }
        if (isOrthogonal(factor) && size.equals(BigInteger.valueOf(4))) {
            return shown + " is not simple, and product groups are not judged yet";
        }
        if (isOrthogonal(factor) && size.equals(BigInteger.TWO)) {
            return shown + " is abelian, and charges are not judged yet";
        }
        return isTooLarge(factor) ? tooLarge(factor) : null;
    }

    /** True if the numbers alone say so; those that pass can still be a little too large. */
    static boolean isTooLarge(Factor factor) {
        return size(factor.arguments()).compareTo(BigInteger.valueOf(2 * LARGEST_RANK)) > 0;
    }

    /** False for the letters of finite and point groups. */
    static boolean isLieFamily(Factor factor) {
        return isClassical(factor) || kind(factor).matches("[UEFG]") || isFullOrthogonal(factor);
    }

    static String tooLarge(Factor factor) {
        return display(factor, false) + " has a rank above " + LARGEST_RANK + ", larger than the groups judged here";
    }

    static String kind(Factor factor) {
        return factor.family().toUpperCase(Locale.ROOT);
    }

    static boolean isOrthogonal(Factor factor) {
        return kind(factor).equals("SO") || kind(factor).equals("SPIN");
    }

    static BigInteger size(List<Integer> arguments) {
        return arguments.stream().map(BigInteger::valueOf).reduce(BigInteger.ZERO, BigInteger::add);
    }

    static Optional<LieGroup> simple(Factor factor, SymplecticUsage usage) {
        List<Integer> arguments = factor.arguments();
        boolean readable = arguments.size() == 1 || arguments.size() == 2;
        if (!readable || arguments.stream().anyMatch(part -> part < 0)) {
            return Optional.empty();
        }
        int size = size(arguments).intValueExact();
        return switch (kind(factor)) {
            case "SU", "SL" -> size < 2 ? Optional.empty() : Optional.of(LieGroup.su(special(factor, size)));
            case "SO", "SPIN" -> size < 3 ? Optional.empty() : Optional.of(LieGroup.so(size));
            case "SP" -> {
                boolean countsRank = usage == SymplecticUsage.RANK || size % 2 != 0 || arguments.size() == 2;
                yield size < 1 ? Optional.empty() : Optional.of(LieGroup.sp(countsRank ? 2 * size : size));
            }
            case "USP" -> size < 2 || size % 2 != 0 ? Optional.empty() : Optional.of(LieGroup.sp(size));
            case "E" ->
                arguments.size() == 1 && size >= 6 && size <= 8 ? exceptional(Series.E, size) : Optional.empty();
            case "F" -> arguments.equals(List.of(4)) ? exceptional(Series.F, 4) : Optional.empty();
            case "G" -> arguments.equals(List.of(2)) ? exceptional(Series.G, 2) : Optional.empty();
            default -> Optional.empty();
        };
    }

    private static Optional<LieGroup> exceptional(Series series, int rank) {
        return Optional.of(LieGroup.exceptional(series, rank));
    }

    /** SL(n,H) consists of quaternionic matrices: its complex algebra is that of SL(2n). */
    private static int special(Factor factor, int size) {
        return kind(factor).equals("SL") && factor.suffix().equals("H") ? 2 * size : size;
    }
}
