package irreproof.check.judge;

import irreproof.check.judge.Judgement.WrongPart;
import irreproof.engine.Decomposition;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Symmetry;
import irreproof.notation.Statement;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * Checks the subscripts S and A of the terms of a square: whether each term lies in the part it claims, as often as it is
 * listed there. Subscripts are taken so only if the decisive side is a square and every marked term could mean it; a
 * lone mark may be a label of the author's.
 */
final class Parts {
    private Parts() {}

    static <I extends Comparable<? super I>> List<WrongPart> wrong(
            Statement statement,
            Lexicon<I> lexicon,
            Reading<I> reading,
            Evaluator<I> evaluator,
            List<Decomposition<I>> values) {
        int reference = Chain.reference(statement);
        if (!(statement.sides().get(reference) instanceof Product product)
                || product.factors().size() != 2) {
            return List.of();
        }
        Decomposition<I> factor = evaluator.value(product.factors().get(0));
        if (!factor.equals(evaluator.value(product.factors().get(1)))) {
            return List.of();
        }
        List<WrongPart> wrong = new ArrayList<>();
        for (int i = 0; i < statement.sides().size(); i++) {
            List<Marked> marked =
                    i == reference ? List.of() : marked(statement.sides().get(i), lexicon);
            if (meansParts(marked, statement.sides().get(i))) {
                wrong.addAll(wrongTerms(marked, lexicon, reading, evaluator, factor));
            }
        }
        return wrong;
    }

    private record Marked(Name name, long count, Symmetry symmetry) {}

    private static boolean meansParts(List<Marked> marked, Expression side) {
        long kinds = marked.stream().map(Marked::symmetry).distinct().count();
        return kinds == 2 || kinds == 1 && marked.size() == Names.terms(side).size();
    }

    private static <I extends Comparable<? super I>> List<WrongPart> wrongTerms(
            List<Marked> marked,
            Lexicon<I> lexicon,
            Reading<I> reading,
            Evaluator<I> evaluator,
            Decomposition<I> factor) {
        Map<Symmetry, Decomposition<I>> left = new EnumMap<>(Symmetry.class);
        for (Symmetry symmetry : Symmetry.values()) {
            left.put(symmetry, evaluator.square(factor, symmetry));
        }
        List<WrongPart> wrong = new ArrayList<>();
        for (Marked term : marked) {
            Decomposition<I> rest =
                    left.get(term.symmetry()).minus(evaluator.value(term.name()).times(term.count()));
            if (rest.isActual()) {
                left.put(term.symmetry(), rest);
            } else {
                wrong.add(new WrongPart(term.name(), term.symmetry()));
            }
        }
        return wrong;
    }

    private static List<Marked> marked(Expression side, Lexicon<?> lexicon) {
        List<Marked> marked = new ArrayList<>();
        for (Expression term : Names.terms(side)) {
            long count = 1;
            if (term instanceof Multiple multiple && multiple.count().bitLength() < 32) {
                count = multiple.count().longValue();
                term = multiple.body();
            }
            Symmetry symmetry = term instanceof Name name ? lexicon.claimedPart(name) : null;
            if (symmetry != null) {
                marked.add(new Marked((Name) term, count, symmetry));
            }
        }
        return marked;
    }
}
