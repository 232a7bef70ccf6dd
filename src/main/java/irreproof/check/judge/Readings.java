package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.notation.Expression.Name;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * The consistent readings of a list of names: equal names equal irreps; names of one dimension that differ in their
 * primes different irreps. Enumerated by how unusual they are, the usual one first.
 */
final class Readings<I extends Comparable<? super I>> {
    /** As many as are ever tried for one statement. */
    static final int MOST = 96;

    private final Lexicon<I> lexicon;
    private final Interpretation interpretation;
    private final Map<NameKey, List<Candidate<I>>> candidates;
    private final List<Name> unknown;
    private boolean truncated;

    private Readings(
            Lexicon<I> lexicon,
            Interpretation interpretation,
            Map<NameKey, List<Candidate<I>>> candidates,
            List<Name> unknown) {
        this.lexicon = lexicon;
        this.interpretation = interpretation;
        this.candidates = candidates;
        this.unknown = unknown;
    }

    /** @throws irreproof.budget.BudgetExceeded if looking a name up is too large a search */
    static <I extends Comparable<? super I>> Readings<I> of(
            Lexicon<I> lexicon, Interpretation interpretation, List<Name> names, Budget budget) {
        Map<NameKey, List<Candidate<I>>> candidates = new LinkedHashMap<>();
        List<Name> unknown = new ArrayList<>();
        for (Name name : names) {
            List<Candidate<I>> found = candidates.computeIfAbsent(
                    lexicon.key(name, interpretation), key -> lexicon.candidates(name, interpretation, budget));
            if (found.isEmpty()) {
                unknown.add(name);
            }
        }
        return new Readings<>(lexicon, interpretation, candidates, unknown);
    }

    /** Names that mean nothing in this setting. */
    List<Name> unknown() {
        return unknown;
    }

    /** True if {@link #all} left readings out. */
    boolean truncated() {
        return truncated;
    }

    /** The readings of some of the names alone. */
    Readings<I> of(List<Name> names) {
        Map<NameKey, List<Candidate<I>>> some = new LinkedHashMap<>();
        for (Name name : names) {
            NameKey key = lexicon.key(name, interpretation);
            some.put(key, candidates.get(key));
        }
        return new Readings<>(lexicon, interpretation, some, List.of());
    }

    /** The readings that give the name only such meanings; perhaps none. */
    Readings<I> keeping(Name name, Predicate<Candidate<I>> possible) {
        Map<NameKey, List<Candidate<I>>> fewer = new LinkedHashMap<>(candidates);
        fewer.computeIfPresent(
                lexicon.key(name, interpretation),
                (key, list) -> list.stream().filter(possible).toList());
        return new Readings<>(lexicon, interpretation, fewer, unknown);
    }

    /** The most usual readings, the usual one first. */
    List<Reading<I>> all(int most) {
        List<NameKey> keys = List.copyOf(candidates.keySet());
        List<Reading<I>> result = new ArrayList<>();
        int worst = candidates.values().stream()
                .mapToInt(
                        list -> list.stream().mapToInt(Candidate::unusual).max().orElse(0))
                .sum();
        truncated = false;
        for (int unusual = 0; unusual <= worst && !truncated; unusual++) {
            extend(keys, 0, unusual, most, new LinkedHashMap<>(), result);
        }
        return result;
    }

    /** All assignments of the keys from here on whose unusualness adds up to exactly what is left. */
    private void extend(
            List<NameKey> keys,
            int from,
            int left,
            int most,
            Map<NameKey, Candidate<I>> chosen,
            List<Reading<I>> result) {
        if (from == keys.size()) {
            if (left == 0 && result.size() < most) {
                int unusual = interpretation.unusual()
                        + chosen.values().stream().mapToInt(Candidate::unusual).sum();
                result.add(new Reading<>(interpretation, chosen, unusual));
            } else if (left == 0) {
                truncated = true;
            }
            return;
        }
        NameKey key = keys.get(from);
        for (Candidate<I> candidate : candidates.get(key)) {
            if (!truncated && candidate.unusual() <= left && isNew(key, candidate, chosen)) {
                chosen.put(key, candidate);
                extend(keys, from + 1, left - candidate.unusual(), most, chosen, result);
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
                .filter(other -> other.getKey().number() != key.number())
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
