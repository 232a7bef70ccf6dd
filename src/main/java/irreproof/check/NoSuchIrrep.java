package irreproof.check;

import irreproof.notation.Expression.Name;
import java.util.ArrayList;
import java.util.List;

/** A name that no irrep of the group can have. */
final class NoSuchIrrep implements StatementRule {
    @Override
    public String name() {
        return "no-such-irrep";
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
        for (Name name : subject.ruling().judgement().unknownNames()) {
            String message = subject.ruling().settingName() + " has no irrep "
                    + subject.wording().written(name);
            findings.add(subject.finding(this, name.span(), message, List.of(), List.of()));
        }
        return findings;
    }
}
