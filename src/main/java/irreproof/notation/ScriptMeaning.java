package irreproof.notation;

import irreproof.notation.Expression.Symmetry;
import java.util.List;

/** What a subscript (or a superscript that is no power, prime or star) says about the name it stands at. */
sealed interface ScriptMeaning {
    /** Nothing: an empty script. */
    record Nothing() implements ScriptMeaning {}

    /** The symmetric or antisymmetric part. */
    record Part(Symmetry symmetry) implements ScriptMeaning {}

    /** Part of the name: {@code v}, {@code s}, {@code c}, {@code +}, ... */
    record Label(String label) implements ScriptMeaning {}

    /** U(1) charges, as written. */
    record Charges(List<String> charges) implements ScriptMeaning {}

    /** Anything else, such as a field's index. */
    record Other() implements ScriptMeaning {}
}
