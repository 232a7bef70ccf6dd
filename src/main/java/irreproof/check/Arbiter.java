package irreproof.check;

import irreproof.budget.Budget;
import irreproof.check.SettingCandidate.Nearness;
import irreproof.check.judge.Chain;
import irreproof.check.judge.DeclaredNames;
import irreproof.check.judge.DimensionSums;
import irreproof.check.judge.Interpretation.Numbers;
import irreproof.check.judge.Judge;
import irreproof.check.judge.Judgement;
import irreproof.check.judge.Judgement.Outcome;
import irreproof.check.judge.LieLexicon;
import irreproof.check.judge.Names;
import irreproof.engine.lie.DominantWeight;
import irreproof.naming.Resolution;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.notation.Relation;
import irreproof.notation.Statement;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Decides a statement among the settings it may have, nearest first. It holds if it does in the nearest group whose
 * irreps it names; it fails only if that group is certain. A group that lacks the irreps of the deciding side is not
 * the statement's group. Where another group that the text does not name would make it true, it is undecided.
 */
final class Arbiter {
    /** For each of many small groups: enough for what papers leave without a group. */
    private static final long INFERENCE_STEPS = 200_000;

    private final DeclaredNames names;
    private final Budget budget;
    private final long stepsPerStatement;

    Arbiter(DeclaredNames names, Budget budget, long stepsPerStatement) {
        this.names = names;
        this.budget = budget;
        this.stepsPerStatement = stepsPerStatement;
    }

    private record Trial(SettingCandidate setting, LieLexicon lexicon, Judgement<DominantWeight> judgement) {
        boolean is(Outcome outcome) {
            return judgement.outcome() == outcome;
        }

        boolean holdsAsUsual() {
            return is(Outcome.HOLDS) && judgement.reading().unusual() == 0;
        }
    }

    /** @param finiteGroups true if the text around speaks of finite groups or other things that are not judged */
    Ruling decide(Statement statement, List<SettingCandidate> candidates, boolean finiteGroups) {
        if (!statement.problems().isEmpty()) {
            return Ruling.undecided(
                    "cannot be read: " + statement.problems().get(0).message(), null, SettingSource.NONE);
        }
        if (statement.relations().isEmpty()) {
            return bare(statement, candidates);
        }
        if (Chain.looksLikeBranching(statement)) {
            return branching(statement, candidates);
        }
        if (Chain.links(statement).isEmpty()) {
            return Ruling.undecided("dots on every side leave nothing to check", null, SettingSource.NONE);
        }
        if (!candidates.isEmpty()) {
            return among(statement, candidates, finiteGroups);
        }
        return finiteGroups && dimensionsDiffer(statement).isEmpty()
                ? Ruling.undecided("the text speaks of finite groups or the like", null, SettingSource.NONE)
                : withoutSetting(statement);
    }

    private Ruling among(Statement statement, List<SettingCandidate> candidates, boolean finiteGroups) {
        List<Trial> trials = new ArrayList<>();
        SettingCandidate unsupported = null;
        for (SettingCandidate candidate : candidates) {
            if (!(candidate.group() instanceof Resolution.Simple simple)) {
                unsupported = unsupported == null ? candidate : unsupported;
                continue;
            }
            Trial trial = judge(statement, candidate, simple);
            trials.add(trial);
            if (trial.is(Outcome.UNDECIDED) && trials.stream().noneMatch(other -> other.is(Outcome.FAILS))) {
                return settled(trial, Verdict.UNDECIDED, trial.judgement().reason());
            }
            if (trial.is(Outcome.HOLDS) && isRemainder(statement)) {
                return settled(trial, Verdict.UNDECIDED, "its left side stands elsewhere");
            }
            if (trial.is(Outcome.HOLDS)) {
                return holds(trial, trials, unsupported);
            }
        }
        Optional<Trial> failed = trials.stream()
                .filter(trial -> trial.is(Outcome.FAILS))
                .min(Comparator.comparing((Trial trial) -> trial.setting().near())
                        .thenComparingLong(trial -> trial.judgement().distance()));
        if (failed.isPresent()) {
            return fails(statement, failed.get(), unsupported, finiteGroups);
        }
        return noneFits(statement, trials, unsupported);
    }

    /** Sums that agree with each other say little if the product they decompose stands elsewhere. */
    private static boolean isRemainder(Statement statement) {
        return statement.continued() && statement.sides().stream().noneMatch(Names::multiplies);
    }

    private static Ruling holds(Trial trial, List<Trial> trials, SettingCandidate unsupported) {
        Nearness near = trial.setting().near();
        Optional<Trial> nearerFailure = trials.stream()
                .filter(other -> other.is(Outcome.FAILS) && !other.setting().factor())
                .filter(other -> other.setting().near().compareTo(Nearness.PARAGRAPH) <= 0)
                .filter(other -> other.setting().near().isNearerThan(near))
                .findFirst();
        if (nearerFailure.isEmpty()) {
            return settled(trial, Verdict.HOLDS, "");
        }
        Trial nearer = nearerFailure.get();
        String reason = "it holds in " + trial.lexicon().group().display() + " but not in "
                + nearer.lexicon().group().display() + ", which is named nearer";
        SettingCandidate elsewhere = unsupported == null ? trial.setting() : null;
        return new Ruling(
                Verdict.UNDECIDED,
                reason,
                nearer.setting(),
                nearer.setting().near().source(),
                nearer.judgement(),
                nearer.lexicon(),
                elsewhere,
                null);
    }

    private Ruling fails(Statement statement, Trial failed, SettingCandidate unsupported, boolean finiteGroups) {
        Nearness near = failed.setting().near();
        boolean declared = near == Nearness.DIRECTIVE;
        if (!declared && finiteGroups) {
            return settled(failed, Verdict.UNDECIDED, "the text speaks of finite groups or the like");
        }
        if (!declared && dimensionsDiffer(statement).isPresent()) {
            return settled(failed, Verdict.FAILS, "");
        }
        if (unsupported != null && !near.isNearerThan(unsupported.near())) {
            return Ruling.undecided(
                    reason(unsupported), unsupported, unsupported.near().source());
        }
        if (failed.setting().factor()) {
            return settled(failed, Verdict.UNDECIDED, "it may be about another factor of the group");
        }
        boolean ofSpin = failed.lexicon().group().algebra().rank() == 1 && near != Nearness.PASSAGE;
        boolean weak = near == Nearness.HEADING
                || near == Nearness.DOCUMENT
                || !declared && ofSpin
                || !declared && !failed.judgement().unknownNames().isEmpty();
        if (weak) {
            Optional<Trial> other = Inference.firstThatHolds(
                    group -> judge(statement, null, group, INFERENCE_STEPS), Trial::holdsAsUsual);
            if (other.isPresent()) {
                return settled(
                        failed,
                        Verdict.UNDECIDED,
                        "it fails in " + failed.lexicon().group().display() + " but holds in "
                                + other.get().lexicon().group().display());
            }
        }
        return settled(failed, Verdict.FAILS, "");
    }

    private Ruling noneFits(Statement statement, List<Trial> trials, SettingCandidate unsupported) {
        Optional<Ruling.Dimensions> dimensions = dimensionsDiffer(statement);
        if (dimensions.isPresent()) {
            return differs(dimensions.get());
        }
        if (unsupported != null) {
            return Ruling.undecided(
                    reason(unsupported), unsupported, unsupported.near().source());
        }
        Trial nearest = trials.get(0);
        boolean named = !nearest.judgement().unknownNames().isEmpty();
        if (named && nearest.setting().near() == Nearness.DIRECTIVE) {
            return settled(nearest, Verdict.FAILS, "");
        }
        Optional<Trial> inferred = Inference.onlyOneThatHolds(
                group -> judge(statement, null, group, INFERENCE_STEPS), Trial::holdsAsUsual);
        if (inferred.isPresent()) {
            return settled(inferred.get(), Verdict.HOLDS, "");
        }
        String reason = nearest.judgement().reason().isEmpty()
                ? "no group named in the text has irreps of these dimensions"
                : nearest.judgement().reason();
        return Ruling.undecided(
                reason, nearest.setting(), nearest.setting().near().source());
    }

    private Ruling withoutSetting(Statement statement) {
        Optional<Ruling.Dimensions> dimensions = dimensionsDiffer(statement);
        if (dimensions.isPresent()) {
            return differs(dimensions.get());
        }
        return Inference.onlyOneThatHolds(group -> judge(statement, null, group, INFERENCE_STEPS), Trial::holdsAsUsual)
                .map(trial -> settled(trial, Verdict.HOLDS, ""))
                .orElseGet(() -> Ruling.undecided("no group is named", null, SettingSource.NONE));
    }

    private Ruling bare(Statement statement, List<SettingCandidate> candidates) {
        for (SettingCandidate candidate : candidates) {
            if (candidate.group() instanceof Resolution.Simple simple) {
                Trial trial = judge(statement, candidate, simple);
                if (trial.is(Outcome.HOLDS)) {
                    return settled(trial, Verdict.UNDECIDED, "it asserts nothing");
                }
            }
        }
        return Ruling.undecided("it asserts nothing", null, SettingSource.NONE);
    }

    /** In an equation the dimensions must agree, whatever the subgroup is. */
    private static Ruling branching(Statement statement, List<SettingCandidate> candidates) {
        boolean equation = statement.relations().stream()
                .allMatch(relation -> relation.kind() == Relation.Kind.EQUAL && !relation.negated());
        Optional<Ruling.Dimensions> dimensions = equation ? dimensionsDiffer(statement) : Optional.empty();
        if (dimensions.isPresent()) {
            return differs(dimensions.get());
        }
        SettingCandidate nearest = candidates.isEmpty() ? null : candidates.get(0);
        SettingSource source =
                nearest == null ? SettingSource.NONE : nearest.near().source();
        return Ruling.undecided("branching rules are not judged yet", nearest, source);
    }

    private Trial judge(Statement statement, SettingCandidate setting, Resolution.Simple group) {
        return judge(statement, setting, group, stepsPerStatement);
    }

    private Trial judge(Statement statement, SettingCandidate setting, Resolution.Simple group, long steps) {
        LieLexicon lexicon = new LieLexicon(group.group(), names);
        return new Trial(setting, lexicon, Judge.judge(statement, lexicon, budget.withSteps(steps)));
    }

    private static Ruling settled(Trial trial, Verdict verdict, String reason) {
        SettingSource source = trial.setting() == null
                ? SettingSource.INFERRED
                : trial.setting().near().source();
        return new Ruling(verdict, reason, trial.setting(), source, trial.judgement(), trial.lexicon(), null, null);
    }

    private static Ruling differs(Ruling.Dimensions dimensions) {
        return new Ruling(Verdict.FAILS, "", null, SettingSource.NONE, null, null, null, dimensions);
    }

    private static String reason(SettingCandidate unsupported) {
        String group = unsupported.group().display();
        String reason = ((Resolution.Unsupported) unsupported.group()).reason();
        return reason.contains(group) ? reason : group + ": " + reason;
    }

    /**
     * Two sides joined by equality whose dimensions differ, whether numbers are dimensions or spins. Plain digits alone may
     * be some other arithmetic unless a product of names stands against sums.
     */
    private static Optional<Ruling.Dimensions> dimensionsDiffer(Statement statement) {
        if (!speaksOfIrreps(statement)) {
            return Optional.empty();
        }
        for (Chain.Link link : Chain.links(statement)) {
            if (!link.isEquation()) {
                continue;
            }
            Optional<Ruling.Dimensions> asDimensions = differ(statement, link, Numbers.DIMENSION);
            Optional<Ruling.Dimensions> asSpins = differ(statement, link, Numbers.SPIN);
            if (asDimensions.isPresent() && asSpins.isPresent()) {
                return asDimensions;
            }
        }
        return Optional.empty();
    }

    private static boolean speaksOfIrreps(Statement statement) {
        int deciding = Chain.reference(statement);
        boolean styled = statement.sides().stream()
                .flatMap(side -> Names.of(side).stream())
                .anyMatch(name -> !(name instanceof NumberName number)
                        || number.face() != Face.PLAIN
                        || number.decoration().bars() > 0);
        for (int i = 0; i < statement.sides().size(); i++) {
            Expression side = statement.sides().get(i);
            if (i != deciding
                    && side instanceof Name
                    && Names.multiplies(statement.sides().get(deciding))) {
                return false;
            }
            boolean plain = i == deciding
                    ? side.parts().stream().allMatch(Name.class::isInstance)
                    : side instanceof Sum || side instanceof Product;
            if (!styled && !plain) {
                return false;
            }
        }
        return true;
    }

    private static Optional<Ruling.Dimensions> differ(Statement statement, Chain.Link link, Numbers numbers) {
        Optional<BigInteger> found = DimensionSums.of(statement.sides().get(link.side()), numbers);
        Optional<BigInteger> expected = DimensionSums.of(statement.sides().get(link.against()), numbers);
        if (found.isEmpty() || expected.isEmpty() || found.equals(expected)) {
            return Optional.empty();
        }
        return Optional.of(new Ruling.Dimensions(link.side(), link.against(), found.get(), expected.get()));
    }
}
