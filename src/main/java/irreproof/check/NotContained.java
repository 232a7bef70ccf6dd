package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.lie.DominantWeight;
import java.util.ArrayList;
import java.util.List;

/** A term is said to occur where it does not, or more often than it does. */
final class NotContained implements StatementRule {
    @Override
    public String name() {
        return "not-contained";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        List<Finding> findings = new ArrayList<>();
        for (Comparison<DominantWeight> failure : subject.failures()) {
            if (failure.kind() == Comparison.Kind.PART_OF) {
                findings.add(finding(subject, failure));
            }
        }
        return findings;
    }

    private Finding finding(Case subject, Comparison<DominantWeight> failure) {
        DominantWeight first =
                failure.surplus().multiplicities().keySet().iterator().next();
        long present = failure.expected().multiplicity(first);
        String name = subject.wording().name(first, failure.side());
        String message = present == 0
                ? name + " does not occur here"
                : name + " occurs " + Wording.times(present) + " here, not "
                        + Wording.times(failure.found().multiplicity(first));
        String whole = subject.wording().sum(failure.expected(), failure.side());
        return subject.finding(
                this,
                subject.wording().place(first, failure.side()),
                message,
                whole.isEmpty() ? List.of() : List.of("the whole sum is " + whole),
                List.of());
    }
}
