package irreproof.naming;

import irreproof.engine.lie.Published;
import irreproof.engine.lie.Series;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the names and groups of the published tables: {@code 20''~}, {@code 840'v}, {@code SU(5)}. */
final class WrittenNames {
    private static final Pattern NAME = Pattern.compile("(\\d+)('*)([vsc]*)(~?)");

    private WrittenNames() {}

    static IrrepLabel label(String written) {
        Matcher match = NAME.matcher(written);
        if (!match.matches()) {
            throw new IllegalArgumentException("not a name: " + written);
        }
        return new IrrepLabel(
                new BigInteger(match.group(1)),
                match.group(2).length(),
                !match.group(4).isEmpty(),
                match.group(3));
    }

    /** {@code 8v + 2*56v}, with repetition. */
    static List<IrrepLabel> sum(String written) {
        List<IrrepLabel> labels = new ArrayList<>();
        for (String term : written.split(" \\+ ")) {
            String[] parts = term.split("\\*");
            int times = parts.length == 2 ? Integer.parseInt(parts[0]) : 1;
            for (int i = 0; i < times; i++) {
                labels.add(label(parts[parts.length - 1]));
            }
        }
        return labels;
    }

    /** Empty for anything but one simple group of definite size. */
    static Optional<LieGroup> group(String written) {
        return Published.algebra(written).map(algebra -> family(written));
    }

    /** The group of a plain name: {@code SU(5)}, {@code SO(3)}, {@code Sp(2)}, {@code E6}. */
    static LieGroup family(String written) {
        int number = Integer.parseInt(written.replaceAll("\\D", ""));
        return switch (written.substring(0, 2)) {
            case "SU" -> LieGroup.su(number);
            case "SO" -> LieGroup.so(number);
            case "Sp" -> LieGroup.sp(number);
            default -> LieGroup.exceptional(Series.valueOf(written.substring(0, 1)), number);
        };
    }
}
