package irreproof.notation;

import irreproof.notation.GroupName.Factor;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Recognises one factor of a group name at a place of a text. */
final class GroupPatterns {
    private static final Pattern START = Pattern.compile("(?<![\\p{L}\\p{N}\\\\])[A-Za-zΔΣ]");
    private static final Pattern CLASSICAL =
            Pattern.compile("(USp|USP|SU|SO|SP|Sp|Spin|SL|GL|U|O|usp|su|so|sp|sl|gl|u|o)(?:\\^?\\*)?"
                    + "(?: ?\\(([^()|]{1,20})\\)|_(?:\\{(\\d{1,3})\\}|(\\d{1,3})))");
    private static final Pattern EXCEPTIONAL =
            Pattern.compile("([EFGefg])(?:_?([24678])|_\\{([24678])(?:\\(([+\\-−]?\\d{1,3})\\))?\\})(?![\\d(])");
    private static final Pattern POINT =
            Pattern.compile("(?:([CD])_\\{?(\\d{1,2})([vhd])\\}?|(O)_\\{?(h)\\}?)(?![\\p{L}\\d])");
    private static final Pattern FINITE = Pattern.compile(
            "([ABCDSQZTI])(?:_(?:\\{(\\d{1,3})([a-z]?)\\}|(\\d{1,3})(?!\\d)|\\{?([hdsi])\\}?))(?![\\p{L}\\d(^])");
    private static final Pattern LABEL = Pattern.compile(
            "[_^](?:\\{((?:[^{}]|\\{[^{}]*\\}){1,20})\\}|([^\\s{}\\\\]))|([A-Za-z])(?![\\p{L}\\p{N}(])");
    private static final Pattern NUMBERS = Pattern.compile("(\\d{1,4})(?:,(\\d{1,4}))?(?:[,;]([CRHℂℝℍ])?)?");
    private static final Pattern SYMBOLIC = Pattern.compile(
            "(?=.*\\p{L})(?:[\\p{L}\\d_{}+\\-−]|,(?=[\\p{L}\\d])){1,20}|\\p{L}[\\p{L}_{}]{0,6}=(\\d{1,4})");
    private static final Map<String, String> FAMILIES = Map.of("USP", "USp", "SPIN", "Spin", "SP", "Sp");

    private final String text;
    private final Matcher start;

    GroupPatterns(String text) {
        this.text = text;
        start = START.matcher(text);
    }

    /**
     * A factor, repeated if it carries an exponent.
     *
     * @param certain false if it needs a word beside it to be taken for a group
     */
    record Found(List<Factor> factors, int end, boolean certain) {}

    String text() {
        return text;
    }

    /** The next place where a name may start, or a negative number. */
    int next(int from) {
        return from <= text.length() && start.find(from) ? start.start() : -1;
    }

    /** True if a word goes on behind a name, which then is none. */
    boolean goesOn(int end) {
        return end < text.length() && Character.isLetterOrDigit(text.charAt(end));
    }

    Found factorAt(int place) {
        Found found = classical(place);
        if (found == null) {
            found = exceptional(place);
        }
        if (found == null) {
            found = point(place);
        }
        return found != null ? found : finite(place);
    }

    private Matcher at(Pattern pattern, int place) {
        Matcher matcher = pattern.matcher(text).region(place, text.length()).useTransparentBounds(true);
        return matcher.lookingAt() ? matcher : null;
    }

    private Found classical(int place) {
        Matcher matcher = at(CLASSICAL, place);
        if (matcher == null) {
            return null;
        }
        String written = matcher.group(1);
        boolean algebra = Character.isLowerCase(written.charAt(0));
        String upper = written.toUpperCase(Locale.ROOT);
        String family = FAMILIES.getOrDefault(upper, upper);
        if (text.charAt(matcher.end(1)) == ' ' && !family.equals("SU")) {
            return null;
        }
        String subscript = matcher.group(3) != null ? matcher.group(3) : matcher.group(4);
        if (subscript != null) {
            boolean chemical = family.equals("SO") && !algebra && subscript.length() == 1;
            boolean letter = family.length() == 1;
            return chemical || letter
                    ? null
                    : labelled(family, List.of(Integer.parseInt(subscript)), "", algebra, matcher.end(), true);
        }
        String arguments = matcher.group(2).replace(" ", "");
        Matcher numbers = NUMBERS.matcher(arguments);
        if (numbers.matches()) {
            List<Integer> sizes = new ArrayList<>();
            sizes.add(Integer.parseInt(numbers.group(1)));
            if (numbers.group(2) != null) {
                sizes.add(Integer.parseInt(numbers.group(2)));
            }
            String field = numbers.group(3) == null
                    ? ""
                    : numbers.group(3).replace('ℂ', 'C').replace('ℝ', 'R').replace('ℍ', 'H');
            boolean bigO = family.equals("O") && sizes.equals(List.of(1));
            boolean function = algebra && family.length() == 1;
            return labelled(family, sizes, field, algebra, matcher.end(), !bigO && !function);
        }
        Matcher symbolic = SYMBOLIC.matcher(arguments);
        if (!symbolic.matches()) {
            return null;
        }
        List<Integer> sizes = symbolic.group(1) == null ? List.of() : List.of(Integer.parseInt(symbolic.group(1)));
        return labelled(family, sizes, "", algebra, matcher.end(), family.length() > 1);
    }

    private Found exceptional(int place) {
        Matcher matcher = at(EXCEPTIONAL, place);
        if (matcher == null) {
            return null;
        }
        String family = matcher.group(1).toUpperCase(Locale.ROOT);
        int rank = Integer.parseInt(matcher.group(2) != null ? matcher.group(2) : matcher.group(3));
        boolean exists = switch (family) {
            case "E" -> rank >= 6;
            case "F" -> rank == 4;
            default -> rank == 2;
        };
        boolean algebra = Character.isLowerCase(matcher.group(1).charAt(0));
        return exists ? labelled(family, List.of(rank), "", algebra, matcher.end(), !algebra) : null;
    }

    private Found point(int place) {
        Matcher matcher = at(POINT, place);
        if (matcher == null) {
            return null;
        }
        boolean octahedral = matcher.group(4) != null;
        List<Integer> order = octahedral ? List.of() : List.of(Integer.parseInt(matcher.group(2)));
        String family = octahedral ? "O" : matcher.group(1);
        String suffix = matcher.group(octahedral ? 5 : 3);
        return new Found(List.of(new Factor(family, order, suffix, "", false)), matcher.end(), true);
    }

    private Found finite(int place) {
        Matcher matcher = at(FINITE, place);
        if (matcher == null) {
            return null;
        }
        String order = matcher.group(2) != null ? matcher.group(2) : matcher.group(4);
        String suffix = matcher.group(5) != null ? matcher.group(5) : matcher.group(3) == null ? "" : matcher.group(3);
        List<Integer> arguments = order == null ? List.of() : List.of(Integer.parseInt(order));
        Factor factor = new Factor(matcher.group(1), arguments, suffix, "", false);
        return new Found(List.of(factor), matcher.end(), false);
    }

    /** With the subscript, the single letter or the exponent behind it. */
    private Found labelled(
            String family, List<Integer> arguments, String suffix, boolean algebra, int end, boolean certain) {
        int behind = end;
        String label = "";
        int copies = 1;
        Matcher script = at(LABEL, behind);
        while (script != null) {
            String written = script.group(1) != null ? script.group(1) : script.group(2);
            boolean above = written != null && text.charAt(behind) == '^';
            if (written == null) {
                if (!label.isEmpty() || isJoint(script.group(3), script.end())) {
                    break;
                }
                label = script.group(3);
            } else if (above && written.matches("[2-9]")) {
                copies = Integer.parseInt(written);
            } else if (label.isEmpty()) {
                label = written;
            } else if (!above) {
                break;
            }
            behind = script.end();
            script = at(LABEL, behind);
        }
        Factor factor = new Factor(family, arguments, suffix, label, algebra);
        return new Found(Collections.nCopies(copies, factor), behind, certain);
    }

    /** A typed x between factors is no label. */
    private boolean isJoint(String letter, int end) {
        return letter.equalsIgnoreCase("x") && end < text.length() && text.charAt(end) == ' ';
    }
}
