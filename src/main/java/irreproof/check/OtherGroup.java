package irreproof.check;

import java.util.List;

/** The statement fails in the group named nearest, but holds in another that the text names. */
final class OtherGroup implements StatementRule {
    @Override
    public String name() {
        return "other-group";
    }

    @Override
    public Severity severity() {
        return Severity.WARNING;
    }

    @Override
    public List<Finding> examine(Case subject) {
        SettingCandidate elsewhere = subject.ruling().heldElsewhere();
        if (elsewhere == null) {
            return List.of();
        }
        String message = "this fails in " + subject.ruling().settingName() + ", the group named nearest; it holds in "
                + elsewhere.group().display();
        return List.of(subject.finding(this, subject.statement().span(), message, List.of(), List.of()));
    }
}
