package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.notation.Expression.Name;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Enumerates the consistent readings of a list of names, most usual first: equal names equal irreps, different names of
 * one dimension different irreps. At most {@value #MOST} readings are returned; the usual one is always among them.
 */
final class Readings<I extends Comparable<? super I>> {
    static final int MOST = 96;

    private final Lexicon<I> lexicon;
    private final Interpretation interpretation;
    private final Map<NameKey, List<Candidate<I>>> candidates = new LinkedHashMap<>();
    private final List<Name> unknown = new ArrayList<>();
    private boolean truncated;

    Readings(Lexicon<I> lexicon, Interpretation interpretation, List<Name> names, Budget budget) {
        this.lexicon = lexicon;
        this.interpretation = interpretation;
        for (Name name : names) {
            NameKey key = lexicon.key(name, interpretation);
            List<Candidate<I>> found = candidates.get(key);
            if (found == null) {
                found = lexicon.candidates(name, interpretation, budget);
                candidates.put(key, found);
            }
            if (found.isEmpty()) {
                unknown.add(name);
            }
        }
    }

    /** Names that mean nothing in this setting. */
    List<Name> unknown() {
        return unknown;
    }

    /** True if {@link #all} left readings out. */
    boolean truncated() {
        return truncated;
    }

    List<Reading<I>> all() {
        List<NameKey> keys = List.copyOf(candidates.keySet());
        List<Reading<I>> result = new ArrayList<>();
        int worst = candidates.values().stream()
                .mapToInt(
                        list -> list.stream().mapToInt(Candidate::unusual).max().orElse(0))
                .sum();
        for (int unusual = 0; unusual <= worst && !truncated; unusual++) {
            extend(keys, 0, unusual, new LinkedHashMap<>(), result);
        }
        result.sort(Comparator.comparingInt(Reading::unusual));
        return result;
    }

    /** All assignments of the keys from here on whose unusualness adds up to exactly what is left. */
    private void extend(
            List<NameKey> keys, int from, int left, Map<NameKey, Candidate<I>> chosen, List<Reading<I>> result) {
        if (result.size() >= MOST) {
            truncated = true;
            return;
        }
        if (from == keys.size()) {
            if (left == 0) {
                int unusual = interpretation.unusual()
                        + chosen.values().stream().mapToInt(Candidate::unusual).sum();
                result.add(new Reading<>(interpretation, chosen, unusual));
            }
            return;
        }
        NameKey key = keys.get(from);
        for (Candidate<I> candidate : candidates.get(key)) {
            if (candidate.unusual() <= left && isNew(key, candidate, chosen)) {
                chosen.put(key, candidate);
                extend(keys, from + 1, left - candidate.unusual(), chosen, result);
                chosen.remove(key);
            }
        }
    }

    private boolean isNew(NameKey key, Candidate<I> candidate, Map<NameKey, Candidate<I>> chosen) {
        if (key.family().isEmpty()) {
            return true;
        }
        return chosen.entrySet().stream()
                .filter(other -> other.getKey().family().equals(key.family()))
                .noneMatch(other -> sameUpToBar(other.getValue(), candidate));
    }

    private boolean sameUpToBar(Candidate<I> one, Candidate<I> other) {
        if (one.value().equals(other.value())) {
            return true;
        }
        var irreps = one.value().multiplicities().keySet();
        return irreps.size() == 1
                && other.value()
                                .multiplicity(lexicon.ring()
                                        .conjugate(irreps.iterator().next()))
                        == 1;
    }
}
