package irreproof.notation;

import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.StyleLearner.Sample;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Learns how tuples and charges are written from lists and names with charges as they stand in the source. */
final class TupleLearner {
    private static final Pattern CLOSE = Pattern.compile("(?:\\s|\\\\right|\\\\[bB]igg?r?|\\\\[,;!])*[)\\]]");
    private static final Pattern CHARGES = Pattern.compile("\\s*(_\\s*\\{|_|\\()(.+?)(\\}|\\)|)(\\}*)\\s*");
    private static final Pattern CHARGES_OF_NAME = Pattern.compile(".*?(_\\{|_|\\()([-+]?[^_()]*?)(\\}|\\)|)");
    private static final Pattern FRACTION = Pattern.compile("\\\\([td]?frac)\\b|\\\\([td]?frac)(?=\\d)");

    private final String source;
    private final List<Sample> numbers = new ArrayList<>();
    private final List<Sample> spins = new ArrayList<>();
    private TupleStyle style;
    /** A list of plain digits, which may be a tuple or Dynkin labels: it teaches only if nothing else does. */
    private ListName bare;

    TupleLearner(String source) {
        this.source = source;
    }

    /** To be called when all names were looked at. */
    void finish() {
        if (style == null && numbers.isEmpty() && spins.isEmpty() && bare != null) {
            learn(bare);
        }
    }

    /** The numbers inside tuples. */
    List<Sample> numbers() {
        return numbers;
    }

    /** The half-integral spins inside tuples. */
    List<Sample> spins() {
        return spins;
    }

    TupleStyle style() {
        return style == null ? TupleStyle.STANDARD : style;
    }

    void look(Name name) {
        if (name instanceof ListName list) {
            tuple(list);
        } else if (name instanceof NumberName && !name.decoration().charges().isEmpty() && style == null) {
            Matcher behind = CHARGES_OF_NAME.matcher(name.span().of(source));
            if (behind.matches()) {
                String close = behind.group(1).equals("_") ? "}" : behind.group(3);
                style = charged("(", ",", ")", behind, close, hasPlus(name));
            }
        }
    }

    private void tuple(ListName list) {
        List<Expression> entries = list.entries();
        boolean charged = !list.decoration().charges().isEmpty();
        boolean named = entries.stream()
                .anyMatch(entry -> !(entry instanceof NumberName number)
                        || number.face() != Face.PLAIN
                        || !number.decoration().isEmpty()
                        || number.denominator() != 1);
        if (entries.size() < 2) {
            return;
        }
        if (!charged && !named) {
            bare = bare == null ? list : bare;
            return;
        }
        learn(list);
    }

    private void learn(ListName list) {
        List<Expression> entries = list.entries();
        for (Expression entry : entries) {
            if (entry instanceof NumberName number && number.numerator().signum() >= 0) {
                String text = number.span().of(source);
                boolean half = number.denominator() == 2;
                if (half || number.denominator() == 1) {
                    (half ? spins : numbers).add(new Sample(number, text));
                }
            }
        }
        Span first = entries.get(0).span();
        Span last = entries.get(entries.size() - 1).span();
        Span whole = list.span();
        boolean apart = whole.contains(first)
                && whole.contains(last)
                && first.end() <= entries.get(1).span().start();
        if (style != null || list.decoration().bars() > 0 || !apart) {
            return;
        }
        String open = source.substring(whole.start(), first.start());
        String separator = source.substring(first.end(), entries.get(1).span().start());
        String tail = source.substring(last.end(), whole.end());
        Matcher close = CLOSE.matcher(tail);
        if (!separator.contains("\n") && separator.contains(",") && close.lookingAt()) {
            String behind = tail.substring(close.end());
            learn(list, open, separator, close.group(), behind);
        }
    }

    private void learn(ListName list, String open, String separator, String close, String behind) {
        if (list.decoration().charges().isEmpty()) {
            boolean plus = list.entries().stream()
                    .anyMatch(entry -> entry.span().of(source).startsWith("+"));
            String last = list.entries().get(list.entries().size() - 1).span().of(source);
            style = new TupleStyle(
                    open,
                    separator,
                    close + behind,
                    "_{",
                    "}",
                    false,
                    list.entries().size(),
                    fraction(last),
                    plus);
            return;
        }
        Matcher charges = CHARGES.matcher(behind);
        if (charges.matches()) {
            String end = (charges.group(1).equals("_") ? "}" : charges.group(3)) + charges.group(4);
            style = charged(open, separator, close, charges, end, hasPlus(list));
        }
    }

    private static TupleStyle charged(
            String open, String separator, String close, Matcher charges, String end, boolean plus) {
        boolean bare = charges.group(1).equals("_");
        String chargeOpen = charges.group(1).startsWith("_") ? "_{" : "(";
        return new TupleStyle(
                open, separator, close, chargeOpen, end, bare && end.equals("}"), 0, fraction(charges.group(2)), plus);
    }

    private static boolean hasPlus(Name name) {
        return name.decoration().charges().stream().anyMatch(charge -> charge.startsWith("+"));
    }

    private static String fraction(String text) {
        Matcher fraction = FRACTION.matcher(text);
        if (!fraction.find()) {
            return "";
        }
        return fraction.group(1) != null ? fraction.group(1) : fraction.group(2);
    }
}
