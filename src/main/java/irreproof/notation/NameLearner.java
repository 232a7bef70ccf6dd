package irreproof.notation;

import irreproof.notation.Expression.Face;
import irreproof.notation.StyleLearner.Sample;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Learns how dimension names are written from numbers as they stand in the source. */
final class NameLearner {
    private static final Pattern STAR = Pattern.compile("\\^(?:\\*|\\\\ast(?![A-Za-z])|\\{\\s*(?:\\*|\\\\ast)\\s*\\})");
    private static final Pattern PRIME = Pattern.compile("'|\\^\\s*\\{?\\s*\\\\prime");
    private static final Pattern LABEL =
            Pattern.compile("(_\\s*(?:\\{(?:\\s*\\\\[A-Za-z]+\\s*\\{?)?\\s*)?)([vsc]{1,3}|[+-])((?:\\s*\\}){0,2})");

    private final Face face;
    private Spelling plain;
    private Spelling narrow;
    private Spelling wide;
    private String star = "";
    private Boolean primesInside;
    private boolean primeCommand;
    private Boolean labelInside;
    private String labelOpen = "_";
    private String labelClose = "";

    private NameLearner(Face face) {
        this.face = face;
    }

    static NameStyle learn(List<Sample> samples) {
        if (samples.isEmpty()) {
            return NameStyle.STANDARD;
        }
        NameLearner learner = new NameLearner(samples.get(0).name().face());
        for (Sample sample : samples) {
            if (sample.name().face() == learner.face) {
                learner.look(sample);
            }
        }
        return learner.result();
    }

    private void look(Sample sample) {
        String digits = sample.name().numerator().toString();
        String text = sample.text();
        int at = text.indexOf(digits);
        if (at < 0 || text.indexOf(digits, at + digits.length()) >= 0) {
            return;
        }
        Spelling spelling = Spelling.of(text.substring(0, at));
        String behind = text.substring(at + digits.length());
        int bars = sample.name().decoration().bars();
        if (bars == 0 && plain == null) {
            plain = spelling;
        } else if (bars == 1) {
            barred(spelling, behind, digits.length());
        }
        int closing = behind.indexOf('}');
        Matcher prime = PRIME.matcher(behind);
        if (primesInside == null && sample.name().decoration().primes() > 0 && prime.find()) {
            primesInside = prime.start() < closing;
            primeCommand = !prime.group().equals("'");
        }
        Matcher label = LABEL.matcher(behind);
        if (labelInside == null && !sample.name().decoration().label().isEmpty() && label.find()) {
            label(label, closing);
        }
    }

    private void barred(Spelling spelling, String behind, int length) {
        Matcher mark = STAR.matcher(behind);
        if (!spelling.hasBar() && mark.find()) {
            star = star.isEmpty() && narrow == null && wide == null ? mark.group() : star;
            plain = plain == null ? spelling : plain;
        } else if (length == 1) {
            narrow = narrow == null ? spelling : narrow;
        } else {
            wide = wide == null ? spelling : wide;
        }
    }

    /** The subscript's own brackets are those that its opening text opened. */
    private void label(Matcher label, int closing) {
        long opened = label.group(1).chars().filter(c -> c == '{').count();
        labelInside = label.start() < closing;
        labelOpen = label.group(1);
        labelClose = "}".repeat((int) opened);
    }

    private NameStyle result() {
        Spelling base = plain;
        if (base == null && narrow != null) {
            base = narrow.unbarred();
        } else if (base == null && wide != null) {
            base = wide.unbarred();
        }
        if (base == null) {
            base = switch (face) {
                case PLAIN -> Spelling.PLAIN;
                case BOLD -> Spelling.of("\\mathbf{");
                case UNDERLINED -> Spelling.of("\\underline{");
            };
        }
        Spelling narrowBar = narrow != null ? narrow : wide != null ? wide : base.barred(false);
        Spelling wideBar = wide != null ? wide : narrow != null ? narrow : base.barred(true);
        return new NameStyle(
                base,
                narrowBar,
                wideBar,
                star,
                Boolean.TRUE.equals(primesInside),
                primeCommand,
                Boolean.TRUE.equals(labelInside),
                labelOpen,
                labelClose,
                face == Face.PLAIN
                        ? NameStyle.Styling.NONE
                        : base.prefix().isBlank() ? NameStyle.Styling.SWITCHED : NameStyle.Styling.EACH);
    }
}
