package irreproof.notation;

import irreproof.latex.PlainText;
import irreproof.notation.GroupName.Factor;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Finds group names in flattened text: classical groups with a number or a symbol ({@code SU(3)_C}, {@code so(1,9)},
 * {@code SL(2,C)}), exceptional ones ({@code E_{7(7)}}), point groups with a Schoenflies suffix ({@code D_{3h}}), and,
 * where a word such as "group" stands beside them, finite groups ({@code A_4}) and what could also be a coupling or a
 * vector ({@code g_2}). Linear in the length of the text.
 */
public final class GroupReader {
    private static final Pattern JOINT = Pattern.compile("\\s*[×⊗·]\\s*|\\s*[xX]\\s*(?=[A-Za-z])");
    private static final Pattern ALGEBRA_JOINT = Pattern.compile("\\s*[⊕+]\\s*");
    private static final Pattern POWER_OF_BRACKET = Pattern.compile("[\\])]\\^\\{?([2-9])\\}?");

    private GroupReader() {}

    /** All group names in the text, in order; the longest product counts as one. */
    public static List<GroupName> find(PlainText text) {
        List<GroupName> names = new ArrayList<>();
        GroupPatterns patterns = new GroupPatterns(text.text());
        int position = 0;
        int lastEnd = -1;
        while (true) {
            int start = patterns.next(position);
            if (start < 0) {
                return names;
            }
            Chain chain = chain(patterns, start);
            if (chain == null) {
                position = start + 1;
                continue;
            }
            boolean certain = chain.certain()
                    || GroupContext.speaksOfGroups(text.text(), start, chain.end())
                    || lastEnd >= 0 && GroupContext.isEnumerated(text.text(), lastEnd, start);
            if (certain) {
                lastEnd = chain.end();
                names.add(new GroupName(bracketPower(text.text(), start, chain), text.origin(start, chain.end())));
            }
            position = chain.end();
        }
    }

    /** Reads a text that consists of one group name, as typed after {@code --group} or in a directive. */
    public static Optional<GroupName> read(PlainText text) {
        String typed = text.text();
        int start = 0;
        int end = typed.length();
        while (start < end && Character.isWhitespace(typed.charAt(start))) {
            start++;
        }
        while (end > start && Character.isWhitespace(typed.charAt(end - 1))) {
            end--;
        }
        if (start == end) {
            return Optional.empty();
        }
        Chain chain = chain(new GroupPatterns(typed), start);
        return chain == null || chain.end() != end
                ? Optional.empty()
                : Optional.of(new GroupName(chain.factors(), text.origin(start, end)));
    }

    /** Factors with joints between them; certain if at least one of them cannot be anything but a group. */
    private record Chain(List<Factor> factors, int end, boolean certain) {}

    private static Chain chain(GroupPatterns patterns, int start) {
        GroupPatterns.Found found = patterns.factorAt(start);
        if (found == null) {
            return null;
        }
        List<Factor> factors = new ArrayList<>(found.factors());
        boolean certain = found.certain();
        int end = found.end();
        while (true) {
            boolean algebra = factors.get(factors.size() - 1).algebra();
            int next = behindJoint(patterns.text(), end, algebra);
            GroupPatterns.Found more = next < 0 ? null : patterns.factorAt(next);
            if (more == null) {
                return patterns.goesOn(end) ? null : new Chain(factors, end, certain);
            }
            factors.addAll(more.factors());
            certain |= more.certain();
            end = more.end();
        }
    }

    private static int behindJoint(String text, int end, boolean algebra) {
        Matcher joint = JOINT.matcher(text).region(end, text.length()).useTransparentBounds(true);
        if (joint.lookingAt()) {
            return joint.end();
        }
        Matcher sum = ALGEBRA_JOINT.matcher(text).region(end, text.length());
        return algebra && sum.lookingAt() ? sum.end() : -1;
    }

    /** {@code [SU(3)]^3}. */
    private static List<Factor> bracketPower(String text, int start, Chain chain) {
        boolean opened = start > 0 && (text.charAt(start - 1) == '[' || text.charAt(start - 1) == '(');
        Matcher power = POWER_OF_BRACKET.matcher(text).region(chain.end(), text.length());
        if (!opened || !power.lookingAt()) {
            return chain.factors();
        }
        List<Factor> factors = new ArrayList<>();
        for (int i = Integer.parseInt(power.group(1)); i > 0; i--) {
            factors.addAll(chain.factors());
        }
        return factors;
    }
}
