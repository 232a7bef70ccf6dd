package irreproof.check;

import irreproof.check.judge.Judgement.WrongPart;
import irreproof.notation.Expression.Symmetry;
import java.util.ArrayList;
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
        List<Finding> findings = new ArrayList<>();
        for (WrongPart part : subject.ruling().judgement().wrongParts()) {
            String message = subject.wording().written(part.term()) + " does not lie in the " + word(part.claimed())
                    + " part of the square";
            findings.add(subject.finding(this, part.term().span(), message, List.of(), List.of()));
        }
        return findings;
    }

    private static String word(Symmetry symmetry) {
        return switch (symmetry) {
            case SYMMETRIC -> "symmetric";
            case ANTISYMMETRIC -> "antisymmetric";
        };
    }
}
