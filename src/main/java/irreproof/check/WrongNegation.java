package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.lie.DominantWeight;
import java.util.ArrayList;
import java.util.List;

/** What is said to differ, or not to occur, does agree or occur. */
final class WrongNegation implements StatementRule {
    @Override
    public String name() {
        return "wrong-negation";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        List<Finding> findings = new ArrayList<>();
        for (Comparison<DominantWeight> failure : subject.failures()) {
            switch (failure.kind()) {
                case DIFFERENT -> findings.add(finding(subject, "the two sides are equal"));
                case NOT_PART_OF ->
                    findings.add(finding(
                            subject, subject.wording().sum(failure.found(), failure.side()) + " does occur here"));
                case EQUAL, PART_OF -> {}
            }
        }
        return findings;
    }

    private Finding finding(Case subject, String message) {
        return subject.finding(this, subject.statement().span(), message, List.of(), List.of());
    }
}
