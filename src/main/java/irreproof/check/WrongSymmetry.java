package irreproof.check;

import irreproof.check.judge.Judgement.WrongPart;
import irreproof.notation.Expression.Symmetry;
import java.util.List;

/** A term of a square is marked symmetric or antisymmetric and is not. */
final class WrongSymmetry implements StatementRule {
    @Override
    public String name() {
        return "wrong-symmetry";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        if (subject.ruling().verdict() != Verdict.FAILS || subject.ruling().judgement() == null) {
            return List.of();
        }
        List<WrongPart> parts = subject.ruling().judgement().wrongParts();
        if (parts.isEmpty()) {
            return List.of();
        }
        List<String> messages = parts.stream()
                .map(part -> subject.wording().written(part.term()) + " does not lie in the " + word(part.claimed())
                        + " part of the square")
                .toList();
        return List.of(subject.finding(
                this, parts.get(0).term().span(), messages.get(0), messages.subList(1, messages.size()), List.of()));
    }

    private static String word(Symmetry symmetry) {
        return switch (symmetry) {
            case SYMMETRIC -> "symmetric";
            case ANTISYMMETRIC -> "antisymmetric";
        };
    }
}
