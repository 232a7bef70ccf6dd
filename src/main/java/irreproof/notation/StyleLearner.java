package irreproof.notation;

import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.notation.WrittenTerm.WrittenName;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Collects an author's habits from statements, the first ones first; what they do not show keeps its default. */
final class StyleLearner {
    private static final Pattern SIGN = Pattern.compile("(\\s*)(\\\\[A-Za-z]+|\\+|⊕)(\\s*)");
    private static final Pattern PRODUCT_SIGN = Pattern.compile("(\\s*)(?:\\\\otimes|\\\\times|⊗|×)(\\s*)");
    private static final Pattern NOT_A_SUM =
            Pattern.compile("\\\\(?:quad|qquad|nonumber|notag|right|left|ldots|dots|cdots)");
    private static final Pattern COUNTING = Pattern.compile("\\\\[,;:! ]|\\s*(?:\\\\cdot|\\\\times|·|×)\\s*|");

    private final String source;
    private final Map<WrittenName, String> known = new HashMap<>();
    private final List<Sample> numbers = new ArrayList<>();
    private final List<Sample> spins = new ArrayList<>();
    private final List<ListName> lists = new ArrayList<>();
    private final List<DiagramName> diagrams = new ArrayList<>();
    private final TupleLearner tuples;
    private String sumSign;
    private String productGap;
    private String counting;
    private boolean repeats;
    private boolean first;

    StyleLearner(String source) {
        this.source = source;
        this.tuples = new TupleLearner(source);
    }

    /** A number as it stands in the source. */
    record Sample(NumberName name, String text) {}

    AuthorStyle learn(List<Statement> samples) {
        for (Statement statement : samples) {
            first = statement == samples.get(0);
            for (Expression side : statement.sides()) {
                visit(side);
            }
        }
        String sign = sumSign != null ? sumSign : productGap != null ? productGap.replace("#", "\\oplus") : null;
        SumStyle sums = new SumStyle(
                sign == null ? SumStyle.STANDARD.sign() : sign,
                counting == null ? "" : counting,
                counting != null,
                repeats);
        return new AuthorStyle(
                known,
                NameLearner.learn(numbers),
                lists(),
                diagrams(),
                SpinLearner.learn(spins, numbers),
                tuples(),
                sums);
    }

    private AuthorStyle.Tuples tuples() {
        tuples.finish();
        List<Sample> names = tuples.numbers().isEmpty() ? numbers : tuples.numbers();
        return new AuthorStyle.Tuples(
                tuples.style(), NameLearner.learn(names), SpinLearner.learn(tuples.spins(), tuples.numbers()));
    }

    private void visit(Expression tree) {
        if (tree instanceof Sum sum) {
            joined(sum.terms(), true);
            repeats |= repeatsATerm(sum.terms());
        } else if (tree instanceof Product product) {
            joined(product.factors(), false);
        } else if (tree instanceof Multiple multiple) {
            multiple(multiple);
            visit(multiple.body());
        } else if (tree instanceof Name name) {
            name(name);
        } else {
            Trees.children(tree).forEach(this::visit);
        }
    }

    /** Terms that came out of one macro with their sign cannot be told apart in the source and teach nothing. */
    private void joined(List<Expression> parts, boolean sum) {
        boolean apart = true;
        for (int i = 1; i < parts.size(); i++) {
            String gap = gap(parts.get(i - 1).span(), parts.get(i).span());
            apart &= gap != null && !gap.isBlank();
            if (gap != null) {
                learnSign(gap, sum);
            }
        }
        if (apart) {
            parts.forEach(this::visit);
        }
    }

    private void learnSign(String gap, boolean sum) {
        Matcher sign = SIGN.matcher(gap);
        if (sum
                && sumSign == null
                && sign.matches()
                && !NOT_A_SUM.matcher(sign.group(2)).matches()) {
            sumSign = blank(sign.group(1)) + sign.group(2) + blank(sign.group(3));
        }
        Matcher product = PRODUCT_SIGN.matcher(gap);
        if (!sum && productGap == null && product.matches()) {
            productGap = blank(product.group(1)) + "#" + blank(product.group(2));
        }
    }

    private static String blank(String white) {
        return white.isEmpty() ? "" : " ";
    }

    private String gap(Span left, Span right) {
        return left.end() <= right.start() && right.start() <= source.length()
                ? source.substring(left.end(), right.start())
                : null;
    }

    private boolean repeatsATerm(List<Expression> terms) {
        List<String> written = new ArrayList<>();
        for (Expression term : terms) {
            if (term instanceof Name) {
                String text = term.span().of(source);
                if (written.contains(text)) {
                    return true;
                }
                written.add(text);
            }
        }
        return false;
    }

    private void multiple(Multiple multiple) {
        String text = multiple.span().of(source);
        String count = multiple.count().toString();
        int start = multiple.span().start() + count.length();
        if (counting == null
                && text.startsWith(count)
                && start <= multiple.body().span().start()) {
            String between = source.substring(start, multiple.body().span().start());
            counting = COUNTING.matcher(between).matches() ? between : null;
        }
    }

    private void name(Name name) {
        String text = withoutBrackets(name, name.span().of(source));
        boolean oneLine = text.indexOf('\n') < 0 && text.indexOf('%') < 0 && text.indexOf('&') < 0;
        if (text.isEmpty() || !oneLine) {
            return;
        }
        tuples.look(name);
        WrittenName key = key(name);
        if (key != null && (first || fits(name, text))) {
            known.putIfAbsent(key, text);
        }
        if (name instanceof NumberName number) {
            (number.denominator() == 2 ? spins : numbers).add(new Sample(number, text));
        } else if (name instanceof ListName list) {
            lists.add(list);
        } else if (name instanceof DiagramName diagram) {
            diagrams.add(diagram);
        }
    }

    /** A number may stand in brackets for nothing; how else they could be part of a number's name is not learnt. */
    private static String withoutBrackets(Name name, String text) {
        if (!(name instanceof NumberName) || !text.contains("(")) {
            return text;
        }
        boolean around = text.startsWith("(") && text.endsWith(")") && text.indexOf('(', 1) < 0;
        return around ? text.substring(1, text.length() - 1).strip() : "";
    }

    /**
     * A name from another statement belongs to this one's style only in the same face, which must be part of the text and
     * not come from a switch before it.
     */
    private boolean fits(Name name, String text) {
        return !(name instanceof NumberName number)
                || (numbers.isEmpty() || numbers.get(0).name().face() == number.face())
                        && (number.face() == Face.PLAIN || text.contains("\\"));
    }

    private static WrittenName key(Name name) {
        Expression.Decoration decoration = name.decoration();
        if (decoration.symmetry() != null
                || !decoration.charges().isEmpty()
                || !decoration.other().isEmpty()) {
            return null;
        }
        if (name instanceof NumberName number && number.denominator() == 1) {
            return new WrittenTerm.Dimension(
                    number.numerator(), decoration.bars(), decoration.primes(), decoration.label());
        }
        return name instanceof DiagramName diagram && decoration.isEmpty()
                ? new WrittenTerm.Diagram(diagram.rows())
                : null;
    }

    private ListStyle lists() {
        for (ListName list : lists) {
            List<Expression> entries = list.entries();
            boolean labels = entries.size() > 1
                    && entries.stream()
                            .allMatch(entry -> entry instanceof NumberName number && number.face() == Face.PLAIN);
            if (!labels) {
                continue;
            }
            Span first = entries.get(0).span();
            Span last = entries.get(entries.size() - 1).span();
            String separator = gap(first, entries.get(1).span());
            if (separator == null
                    || separator.isEmpty()
                    || !list.span().contains(first)
                    || !list.span().contains(last)) {
                continue;
            }
            String open = source.substring(list.span().start(), first.start());
            String close = source.substring(last.end(), list.span().end());
            if (list.decoration().isEmpty() && !separator.contains("\n")) {
                return new ListStyle(open, separator, close);
            }
        }
        return ListStyle.STANDARD;
    }

    private DiagramStyle diagrams() {
        String singlet = null;
        DiagramStyle style = null;
        boolean boxes = false;
        for (DiagramName diagram : diagrams) {
            if (!diagram.decoration().isEmpty()) {
                continue;
            }
            String text = diagram.span().of(source);
            if (diagram.rows().isEmpty()) {
                singlet = singlet == null ? text : singlet;
                continue;
            }
            String rows = new ListStyle("", ",", "").write(diagram.rows());
            int at = text.indexOf(rows);
            boolean clear = at > 0 && text.indexOf(rows, at + 1) < 0 && !Character.isDigit(text.charAt(at - 1));
            if (style == null && clear) {
                style = new DiagramStyle(text.substring(0, at), text.substring(at + rows.length()), "");
            }
            boxes |= text.contains("ytableau");
        }
        DiagramStyle found =
                style != null ? style : boxes ? new DiagramStyle("\\ydiagram{", "}", "") : DiagramStyle.STANDARD;
        return new DiagramStyle(
                found.open(), found.close(), singlet == null ? DiagramStyle.STANDARD.singlet() : singlet);
    }
}
