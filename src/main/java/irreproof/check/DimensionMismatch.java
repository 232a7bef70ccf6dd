package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Two sides that must be equal have different dimensions. */
final class DimensionMismatch implements StatementRule {
    @Override
    public String name() {
        return "dimension-mismatch";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        Ruling.Dimensions dimensions = subject.ruling().dimensions();
        if (dimensions != null) {
            String message = message(
                    subject, dimensions.against(), dimensions.expected(), dimensions.side(), dimensions.found());
            return List.of(
                    subject.finding(this, subject.side(dimensions.side()).span(), message, List.of(), List.of()));
        }
        List<Finding> findings = new ArrayList<>();
        for (Comparison<DominantWeight> failure : subject.failures()) {
            BigInteger expected = subject.dimension(failure.expected());
            BigInteger found = subject.dimension(failure.found());
            if (failure.kind() == Comparison.Kind.EQUAL && !expected.equals(found)) {
                String difference = subject.difference(failure);
                findings.add(subject.finding(
                        this,
                        subject.side(failure.side()).span(),
                        message(subject, failure.against(), expected, failure.side(), found),
                        difference.isEmpty() ? List.of() : List.of(difference),
                        subject.replaceSide(failure)));
            }
        }
        return findings;
    }

    private static String message(Case subject, int against, BigInteger expected, int side, BigInteger found) {
        boolean inOrder = against < side;
        String first = (inOrder ? expected : found) + " " + subject.sideName(inOrder ? against : side);
        String second = (inOrder ? found : expected) + " " + subject.sideName(inOrder ? side : against);
        return "the dimensions differ: " + first + ", " + second;
    }
}
