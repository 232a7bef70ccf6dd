package irreproof.naming;

import irreproof.engine.Rational;
import irreproof.naming.ProductGroup.Charge;
import irreproof.naming.ProductGroup.Part;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A written name of an irrep of a product group, taken apart: charges may be subscripts or entries, in the group's order
 * or behind all others; with one simple factor the name itself may stand without brackets.
 *
 * @param entries a name for each simple factor, in the group's order
 * @param charges one for each U(1), in the group's order; the positive ones of a charge with both signs
 * @param bothSigns true for {@code \pm}
 * @param bars over the tuple as a whole
 */
public record WrittenTuple(List<Name> entries, List<Rational> charges, boolean bothSigns, int bars) {
    private static final Pattern CHARGE = Pattern.compile("([-+±−]?)(\\d{1,18})(?:/(\\d{1,9}))?");

    public WrittenTuple {
        entries = List.copyOf(entries);
        charges = List.copyOf(charges);
    }

    /** Empty if the name has no such form. */
    public static Optional<WrittenTuple> of(Name name, ProductGroup group) {
        int factors = group.factors().size();
        Decoration decoration = name.decoration();
        List<String> written = decoration.charges();
        if (name instanceof ListName list
                && written.isEmpty()
                && list.entries().size() == group.parts().size()) {
            Optional<WrittenTuple> inOrder = entries(list, group.parts());
            return inOrder.isPresent() ? inOrder : entries(list, chargesLast(group.parts()));
        }
        if (written.size() != group.charges()) {
            return Optional.empty();
        }
        Optional<List<Rational>> charges = charges(written);
        if (charges.isEmpty()) {
            return Optional.empty();
        }
        boolean bothSigns = written.stream().anyMatch(charge -> charge.startsWith("±"));
        if (name instanceof ListName list && list.entries().size() == factors) {
            return names(list.entries())
                    .map(names -> new WrittenTuple(names, charges.get(), bothSigns, decoration.bars()));
        }
        if (factors != 1) {
            boolean trivial = factors == 0
                    && name instanceof NumberName number
                    && number.numerator().equals(BigInteger.ONE);
            return trivial ? Optional.of(new WrittenTuple(List.of(), charges.get(), bothSigns, 0)) : Optional.empty();
        }
        return Optional.of(new WrittenTuple(List.of(name), charges.get(), bothSigns, 0));
    }

    private static List<Part> chargesLast(List<Part> parts) {
        List<Part> sorted = new ArrayList<>(parts);
        sorted.sort(Comparator.comparing(part -> part instanceof Charge));
        return sorted;
    }

    private static Optional<WrittenTuple> entries(ListName list, List<Part> parts) {
        List<Name> names = new ArrayList<>();
        List<Rational> charges = new ArrayList<>();
        for (int i = 0; i < parts.size(); i++) {
            Expression entry = list.entries().get(i);
            if (parts.get(i) instanceof Charge) {
                boolean plain = entry instanceof NumberName number
                        && number.face() == Face.PLAIN
                        && number.decoration().isEmpty();
                if (!plain) {
                    return Optional.empty();
                }
                NumberName number = (NumberName) entry;
                charges.add(new Rational(number.numerator(), BigInteger.valueOf(number.denominator())));
            } else if (entry instanceof Name name && canName(name) && !isFractionFor(parts.get(i), name)) {
                names.add(name);
            } else {
                return Optional.empty();
            }
        }
        return Optional.of(
                new WrittenTuple(names, charges, false, list.decoration().bars()));
    }

    private static Optional<List<Name>> names(List<Expression> entries) {
        List<Name> names = new ArrayList<>();
        for (Expression entry : entries) {
            if (!(entry instanceof Name name) || !canName(name)) {
                return Optional.empty();
            }
            names.add(name);
        }
        return Optional.of(names);
    }

    /** Only irreps of SU(2) go by fractions. */
    private static boolean isFractionFor(Part part, Name name) {
        return name instanceof NumberName number
                && number.denominator() != 1
                && part instanceof ProductGroup.Simple simple
                && simple.group().algebra().rank() > 1;
    }

    private static boolean canName(Name name) {
        return name instanceof NumberName number
                ? number.numerator().signum() >= 0 && number.denominator() <= 2
                : name instanceof DiagramName || name instanceof ListName;
    }

    private static Optional<List<Rational>> charges(List<String> written) {
        List<Rational> charges = new ArrayList<>();
        for (String charge : written) {
            Matcher match = CHARGE.matcher(charge);
            if (!match.matches() || match.group(3) != null && match.group(3).matches("0+")) {
                return Optional.empty();
            }
            long denominator = match.group(3) == null ? 1 : Long.parseLong(match.group(3));
            Rational value = Rational.of(Long.parseLong(match.group(2)), denominator);
            boolean negative = match.group(1).equals("-") || match.group(1).equals("−");
            charges.add(negative ? value.negate() : value);
        }
        return Optional.of(charges);
    }

    /** True if an entry can only be a spin: 0 or a fraction. */
    public boolean hasSpin() {
        return entries.stream()
                .anyMatch(entry -> entry instanceof NumberName number
                        && (number.denominator() != 1 || number.numerator().signum() == 0));
    }

    /** True if an entry can only be a dimension: it is styled, barred or primed. */
    public boolean hasStyledEntry() {
        return entries.stream()
                .anyMatch(entry -> entry instanceof NumberName number
                        && (number.face() != Face.PLAIN
                                || number.decoration().bars()
                                                + number.decoration().primes()
                                        > 0));
    }
}
