package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.lie.DominantWeight;
import java.util.ArrayList;
import java.util.List;

/** The dimensions and the congruence classes agree, but the summands are not those of the product. */
final class WrongDecomposition implements StatementRule {
    @Override
    public String name() {
        return "wrong-decomposition";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        List<Finding> findings = new ArrayList<>();
        for (Comparison<DominantWeight> failure : subject.wrongSums()) {
            if (!CongruenceMismatch.explains(subject, failure)) {
                String message = "the dimensions agree (" + subject.dimension(failure.expected())
                        + "), but not the summands: " + subject.difference(failure);
                findings.add(subject.finding(
                        this, subject.side(failure.side()).span(), message, List.of(), subject.replaceSide(failure)));
            }
        }
        return findings;
    }
}
