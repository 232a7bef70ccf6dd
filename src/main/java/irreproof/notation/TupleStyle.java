package irreproof.notation;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * How irreps of product groups and charges are written.
 *
 * @param open what stands before the first entry
 * @param separator what stands between entries
 * @param close what stands behind the last entry, before the charges
 * @param chargeOpen {@code _{} or {@code (}
 * @param chargeClose what closes it, with all that the tuple opened
 * @param bareDigit true if a charge of one character stands in the subscript without braces
 * @param entries how many entries the author's tuples have if charges are among them; otherwise 0
 * @param fraction the command of a charge's fraction without its backslash, or empty for {@code 1/6}
 * @param plus true if positive charges carry a sign
 */
record TupleStyle(
        String open,
        String separator,
        String close,
        String chargeOpen,
        String chargeClose,
        boolean bareDigit,
        int entries,
        String fraction,
        boolean plus) {
    static final TupleStyle STANDARD = new TupleStyle("(", ",", ")", "_{", "}", false, 0, "", false);

    String write(WrittenTerm.Tuple tuple, Function<WrittenTerm.WrittenName, String> names) {
        List<String> written = new ArrayList<>();
        tuple.entries().forEach(entry -> written.add(names.apply(entry)));
        List<String> charges = tuple.charges().stream().map(this::charge).toList();
        if (entries > 0 && entries == written.size() + charges.size()) {
            written.addAll(charges);
            return open + String.join(separator, written) + close;
        }
        String behind = charges.isEmpty() ? "" : charges(charges);
        return written.size() == 1 ? written.get(0) + behind : open + String.join(separator, written) + close + behind;
    }

    private String charges(List<String> charges) {
        String text = String.join(",", charges);
        return bareDigit && text.length() == 1 ? "_" + text : chargeOpen + text + chargeClose;
    }

    private String charge(String plain) {
        boolean negative = plain.startsWith("-");
        String size = negative ? plain.substring(1) : plain;
        String sign = negative ? "-" : plus && !size.equals("0") ? "+" : "";
        int slash = size.indexOf('/');
        if (slash < 0 || fraction.isEmpty()) {
            return sign + size;
        }
        return sign + "\\" + fraction + "{" + size.substring(0, slash) + "}{" + size.substring(slash + 1) + "}";
    }
}
