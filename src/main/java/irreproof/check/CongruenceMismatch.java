package irreproof.check;

import irreproof.check.judge.Comparison;
import irreproof.engine.Decomposition;
import irreproof.engine.RepresentationRing.CentralCharacter;
import irreproof.engine.lie.DominantWeight;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** The dimensions agree, but a term has an N-ality (congruence class) that no term of the product can have. */
final class CongruenceMismatch implements StatementRule {
    @Override
    public String name() {
        return "congruence-mismatch";
    }

    @Override
    public Severity severity() {
        return Severity.ERROR;
    }

    @Override
    public List<Finding> examine(Case subject) {
        List<Finding> findings = new ArrayList<>();
        for (Comparison<DominantWeight> failure : subject.wrongSums()) {
            Set<CentralCharacter> possible = characters(subject, failure.expected());
            DominantWeight stranger = stranger(subject, failure, possible);
            if (stranger != null) {
                CentralCharacter character = character(subject, stranger);
                CentralCharacter right = possible.iterator().next();
                String message = subject.wording().name(stranger, failure.side()) + " has " + character.name() + " "
                        + character.value() + ", but every term here must have " + right.name() + " " + right.value();
                findings.add(subject.finding(
                        this,
                        subject.wording().place(stranger, failure.side()),
                        message,
                        List.of(subject.difference(failure)),
                        subject.replaceSide(failure)));
            }
        }
        return findings;
    }

    /** True if the rule has something to say of the failure, so that others keep silent. */
    static boolean explains(Case subject, Comparison<DominantWeight> failure) {
        return stranger(subject, failure, characters(subject, failure.expected())) != null;
    }

    private static DominantWeight stranger(
            Case subject, Comparison<DominantWeight> failure, Set<CentralCharacter> possible) {
        if (possible.size() != 1) {
            return null;
        }
        return failure.surplus().multiplicities().keySet().stream()
                .filter(irrep -> !possible.contains(character(subject, irrep)))
                .findFirst()
                .orElse(null);
    }

    private static Set<CentralCharacter> characters(Case subject, Decomposition<DominantWeight> sum) {
        Set<CentralCharacter> found = new HashSet<>();
        sum.multiplicities().keySet().forEach(irrep -> found.add(character(subject, irrep)));
        return found;
    }

    private static CentralCharacter character(Case subject, DominantWeight irrep) {
        return subject.ruling()
                .lexicon()
                .ring()
                .centralCharacter(irrep)
                .orElse(new CentralCharacter("congruence class", "0"));
    }
}
