package irreproof.notation;

import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Adds bars, primes, labels and charges to names. */
final class Decorations {
    private Decorations() {}

    static Name with(Name name, Decoration decoration, Span span) {
        if (name instanceof NumberName number) {
            return new NumberName(number.numerator(), number.denominator(), number.face(), decoration, span);
        }
        if (name instanceof ListName list) {
            return new ListName(list.bracket(), list.entries(), decoration, span);
        }
        return new DiagramName(((DiagramName) name).rows(), decoration, span);
    }

    static Name withBars(Name name, int bars, Span span) {
        Decoration old = name.decoration();
        return with(
                name,
                new Decoration(
                        old.bars() + bars, old.primes(), old.label(), old.symmetry(), old.charges(), old.other()),
                span);
    }

    static Name withPrimes(Name name, int primes, Span span) {
        Decoration old = name.decoration();
        return with(
                name,
                new Decoration(
                        old.bars(), old.primes() + primes, old.label(), old.symmetry(), old.charges(), old.other()),
                span);
    }

    static Name withCharges(Name name, List<String> charges, Span span) {
        Decoration old = name.decoration();
        List<String> all = new ArrayList<>(old.charges());
        all.addAll(charges);
        return with(
                name, new Decoration(old.bars(), old.primes(), old.label(), old.symmetry(), all, old.other()), span);
    }

    /** A name with a script: the first label and the first symmetry count, whatever else is kept as written. */
    static Name withScript(Name name, Lexeme.Script script, Span span) {
        Decoration old = name.decoration();
        if (script.meaning() instanceof ScriptMeaning.Charges charges) {
            return withCharges(name, charges.charges(), span);
        }
        if (script.meaning() instanceof ScriptMeaning.Label label && old.label().isEmpty()) {
            return with(
                    name,
                    new Decoration(old.bars(), old.primes(), label.label(), old.symmetry(), old.charges(), old.other()),
                    span);
        }
        if (script.meaning() instanceof ScriptMeaning.Part part && old.symmetry() == null) {
            return with(
                    name,
                    new Decoration(old.bars(), old.primes(), old.label(), part.symmetry(), old.charges(), old.other()),
                    span);
        }
        return with(
                name,
                new Decoration(
                        old.bars(),
                        old.primes(),
                        old.label(),
                        old.symmetry(),
                        old.charges(),
                        old.other() + script.written()),
                span);
    }
}
