package irreproof.notation;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What an author puts in front of the digits of a name: {@code \mathbf{}, {@code \rep{\bar }, {@code {\bf }, nothing. The
 * brackets it opens are closed behind the digits.
 *
 * @param prefix the text in front of the digits
 * @param bare true if the prefix ends with a command that takes one digit only unless it is given a group
 */
record Spelling(String prefix, boolean bare) {
    static final Spelling PLAIN = new Spelling("", false);

    private static final Pattern LAST_COMMAND = Pattern.compile("\\\\([A-Za-z]+)\\s*$");
    private static final Pattern BAR = Pattern.compile("\\\\(?:bar|overline|widebar|wb|ol)\\b\\s*");

    static Spelling of(String prefix) {
        Matcher last = LAST_COMMAND.matcher(prefix);
        boolean bare = last.find() && !(Commands.of(last.group(1)) instanceof Commands.FaceSwitch);
        return new Spelling(prefix, bare);
    }

    boolean hasBar() {
        return BAR.matcher(prefix).find();
    }

    /** The same without its bar. */
    Spelling unbarred() {
        Matcher bar = BAR.matcher(prefix);
        if (!bar.find()) {
            return this;
        }
        int behind = bar.end();
        boolean group = behind < prefix.length() && prefix.charAt(behind) == '{';
        return of(prefix.substring(0, bar.start()) + prefix.substring(group ? behind + 1 : behind));
    }

    Spelling barred(boolean wide) {
        return of((wide ? "\\overline{" : "\\bar{") + prefix);
    }

    /** The digits with what belongs inside the styling and what belongs outside. */
    String write(String digits, String inside, String outside) {
        StringBuilder text = new StringBuilder(prefix);
        boolean group = bare && digits.length() > 1;
        text.append(group ? "{" + digits + "}" : digits).append(inside);
        int open = 0;
        for (int i = 0; i < prefix.length(); i++) {
            boolean escaped = i > 0 && prefix.charAt(i - 1) == '\\';
            if (!escaped) {
                open += prefix.charAt(i) == '{' ? 1 : prefix.charAt(i) == '}' ? -1 : 0;
            }
        }
        return text.append("}".repeat(Math.max(0, open))).append(outside).toString();
    }
}
