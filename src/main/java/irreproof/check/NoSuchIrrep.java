package irreproof.check;

import irreproof.notation.Expression.Name;
import java.util.List;
import java.util.stream.Collectors;

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
        List<Name> names = subject.ruling().judgement().unknownNames();
        if (names.isEmpty()) {
            return List.of();
        }
        String list = names.stream().map(subject.wording()::written).distinct().collect(Collectors.joining(", "));
        String message = subject.ruling().settingName() + " has no irrep " + list;
        List<Fix> fixes = subject.ruling().judgement().comparisons().stream()
                .flatMap(comparison -> subject.replaceSide(comparison).stream())
                .toList();
        return List.of(subject.finding(this, names.get(0).span(), message, List.of(), fixes));
    }
}
