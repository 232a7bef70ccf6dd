package irreproof.notation;

import irreproof.notation.Expression.Face;
import irreproof.notation.StyleLearner.Sample;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Learns how spins are written. */
final class SpinLearner {
    private static final Pattern SOLIDUS = Pattern.compile("(.*?)(\\d+)\\s*/\\s*2.*");
    private static final Pattern COMMAND = Pattern.compile("(.*?)\\\\([A-Za-z]*frac)\\s*(\\{?)\\s*\\d+.*");

    private SpinLearner() {}

    static SpinStyle learn(List<Sample> spins, List<Sample> numbers) {
        Spelling whole = Spelling.PLAIN;
        boolean styled = false;
        for (Sample number : numbers) {
            String digits = number.name().numerator().toString();
            int at = number.text().indexOf(digits);
            if (at >= 0 && number.name().decoration().isEmpty()) {
                whole = Spelling.of(number.text().substring(0, at));
                styled = number.name().face() != Face.PLAIN;
                break;
            }
        }
        for (Sample spin : spins) {
            Matcher command = COMMAND.matcher(spin.text());
            if (command.matches()) {
                Spelling around = Spelling.of(command.group(1));
                return new SpinStyle(
                        whole, around, command.group(2), !command.group(3).isEmpty(), styled);
            }
            Matcher solidus = SOLIDUS.matcher(spin.text());
            if (solidus.matches()) {
                return new SpinStyle(whole, Spelling.of(solidus.group(1)), "", false, styled);
            }
        }
        SpinStyle standard = SpinStyle.STANDARD;
        return new SpinStyle(whole, whole, standard.command(), standard.braces(), styled);
    }
}
