package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.lie.DominantWeight;
import irreproof.notation.Expression;
import irreproof.notation.Statement;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.math.BigInteger;
import java.util.List;

/** A judged statement as the rules see it, with the words to speak of it. */
record Case(Statement statement, Ruling ruling, Wording wording) {
    /** The comparisons that fail, of a statement that fails and whose names all have a meaning. */
    List<Comparison<DominantWeight>> failures() {
        boolean failed = ruling.verdict() == Verdict.FAILS && ruling.judgement() != null;
        if (!failed || !ruling.judgement().unknownNames().isEmpty()) {
            return List.of();
        }
        return ruling.judgement().comparisons().stream()
                .filter(comparison -> !comparison.holds())
                .toList();
    }

    /** The failures of equality whose dimensions agree. */
    List<Comparison<DominantWeight>> wrongSums() {
        return failures().stream()
                .filter(comparison -> comparison.kind() == Comparison.Kind.EQUAL)
                .filter(comparison -> dimension(comparison.expected()).equals(dimension(comparison.found())))
                .toList();
    }

    BigInteger dimension(irreproof.engine.Decomposition<DominantWeight> sum) {
        return ruling.lexicon().ring().dimension(sum);
    }

    Expression side(int index) {
        return statement.sides().get(index);
    }

    /** How to speak of a side: by its place, or as the product. */
    String sideName(int index) {
        if (statement.sides().size() == 2) {
            return index == 0 ? "on the left" : "on the right";
        }
        return index == 0 ? "in the first side" : "in the side marked here";
    }

    /** "missing X; surplus Y" in the author's notation; empty if neither. */
    String difference(Comparison<DominantWeight> comparison) {
        String missing = wording.sum(comparison.missing(), comparison.side());
        String surplus = wording.sum(comparison.surplus(), comparison.side());
        if (missing.isEmpty()) {
            return surplus.isEmpty() ? "" : "surplus " + surplus;
        }
        return "missing " + missing + (surplus.isEmpty() ? "" : "; surplus " + surplus);
    }

    /** Replaces the side by what it must be; none if a macro hides it together with another side. */
    List<Fix> replaceSide(Comparison<DominantWeight> comparison) {
        String right = wording.corrected(comparison.expected(), comparison.side());
        Span place = side(comparison.side()).span();
        boolean shared = statement.sides().stream()
                .anyMatch(other ->
                        other != side(comparison.side()) && other.span().overlaps(place));
        if (right.isEmpty() || shared) {
            return List.of();
        }
        return List.of(new Fix("Replace by " + right, false, List.of(new TextEdit(place, right))));
    }

    Finding finding(StatementRule rule, Span place, String message, List<String> evidence, List<Fix> fixes) {
        return new Finding(rule.name(), rule.severity(), place, message, evidence, fixes);
    }
}
