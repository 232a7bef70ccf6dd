package irreproof.check;

import irreproof.check.judge.Candidate;
import irreproof.check.judge.Interpretation.Diagrams;
import irreproof.check.judge.NameKey;
import irreproof.check.judge.Names;
import irreproof.check.judge.Reading;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.naming.LieGroup;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Name;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Holds the readings of one document's statements together: a name that the published tables use otherwise is pointed
 * out where it first occurs, and if statements of one group need different meanings of one name, the fewer are warned.
 */
final class DocumentReadings {
    static final String UNUSUAL = "unusual-name";
    static final String CONFLICT = "conflicting-readings";

    private record Key(LieGroup group, NameKey name) {
        // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

        @Override
        public boolean equals(Object other) {
            return other instanceof Key that && name.equals(that.name) && group.equals(that.group);
        }

        @Override
        public int hashCode() {
            return name.hashCode();
        }
    }

    private record Need(int statement, Decomposition<DominantWeight> meaning, boolean usual) {}

    private final List<Case> cases;
    private final List<List<Finding>> findings = new ArrayList<>();
    private final Set<Object> said = new HashSet<>();

    private DocumentReadings(List<Case> cases) {
        this.cases = cases;
        cases.forEach(subject -> findings.add(new ArrayList<>()));
    }

    /** For each statement its findings. */
    static List<List<Finding>> examine(List<Case> cases) {
        DocumentReadings readings = new DocumentReadings(cases);
        readings.warnMinorities();
        readings.adviseUnusual();
        return readings.findings;
    }

    private boolean holds(Case subject) {
        return subject.ruling().verdict() == Verdict.HOLDS && subject.ruling().judgement() != null;
    }

    private void warnMinorities() {
        Map<Key, List<Need>> needs = new LinkedHashMap<>();
        for (int i = 0; i < cases.size(); i++) {
            if (holds(cases.get(i))) {
                collectNeeds(i, needs);
            }
        }
        needs.forEach((key, list) -> {
            Map<Decomposition<DominantWeight>, Long> votes = new HashMap<>();
            list.forEach(need -> votes.merge(need.meaning(), 2L + (need.usual() ? 1 : 0), Long::sum));
            if (votes.size() > 1) {
                said.add(key);
                long most =
                        votes.values().stream().mapToLong(Long::longValue).max().orElse(0);
                Need leader = list.stream()
                        .filter(need -> votes.get(need.meaning()) == most)
                        .findFirst()
                        .orElseThrow();
                list.stream()
                        .filter(need -> !need.meaning().equals(leader.meaning()))
                        .forEach(need -> warn(key.name(), need, leader));
            }
        });
    }

    private void collectNeeds(int statement, Map<Key, List<Need>> needs) {
        Ruling ruling = cases.get(statement).ruling();
        List<Reading<DominantWeight>> satisfying = ruling.judgement().satisfying();
        for (var meaning : satisfying.get(0).meanings().entrySet()) {
            Candidate<DominantWeight> first = meaning.getValue();
            boolean only = !meaning.getKey().family().isEmpty()
                    && satisfying.stream()
                            .map(reading -> reading.meanings().get(meaning.getKey()))
                            .allMatch(other -> other != null && other.value().equals(first.value()));
            if (only) {
                needs.computeIfAbsent(new Key(ruling.lexicon().group(), meaning.getKey()), key -> new ArrayList<>())
                        .add(new Need(statement, first.value(), first.unusual() == 0));
            }
        }
    }

    private void warn(NameKey key, Need need, Need leader) {
        Case subject = cases.get(need.statement());
        Case other = cases.get(leader.statement());
        String message =
                key.text() + " must be " + label(need.meaning()) + " for this to hold, but " + label(leader.meaning())
                        + " in line " + other.wording().line(other.statement().span());
        findings.get(need.statement())
                .add(new Finding(CONFLICT, Severity.WARNING, place(subject, key), message, List.of(), List.of()));
    }

    private void adviseUnusual() {
        for (int i = 0; i < cases.size(); i++) {
            Case subject = cases.get(i);
            if (!holds(subject)) {
                continue;
            }
            Reading<DominantWeight> reading = subject.ruling().judgement().reading();
            for (var meaning : reading.meanings().entrySet()) {
                Key key = new Key(subject.ruling().lexicon().group(), meaning.getKey());
                if (meaning.getValue().unusual() > 0 && said.add(key)) {
                    advise(
                            i,
                            place(subject, meaning.getKey()),
                            unusualMessage(subject, meaning.getKey(), meaning.getValue()));
                }
            }
            if (reading.interpretation().diagrams() == Diagrams.CONJUGATE && said.add(Diagrams.CONJUGATE)) {
                advise(i, diagram(subject), "this holds if a box stands for the conjugate of the fundamental irrep");
            }
        }
    }

    private static String unusualMessage(Case subject, NameKey key, Candidate<DominantWeight> meaning) {
        return "this holds if " + key.text() + " is " + label(meaning.value()) + ", which is usually called "
                + subject.wording().usualName(meaning.value().multiplicities().firstKey());
    }

    private void advise(int statement, Span place, String message) {
        findings.get(statement).add(new Finding(UNUSUAL, Severity.ADVICE, place, message, List.of(), List.of()));
    }

    private static String label(Decomposition<DominantWeight> meaning) {
        return meaning.isZero() ? "0" : meaning.multiplicities().firstKey().toString();
    }

    private static Span place(Case subject, NameKey key) {
        var interpretation = subject.ruling().judgement().reading().interpretation();
        return subject.statement().sides().stream()
                .flatMap(side -> Names.of(side).stream())
                .filter(name ->
                        subject.ruling().lexicon().key(name, interpretation).equals(key))
                .map(Name::span)
                .findFirst()
                .orElse(subject.statement().span());
    }

    private static Span diagram(Case subject) {
        return subject.statement().sides().stream()
                .flatMap(side -> Names.of(side).stream())
                .filter(DiagramName.class::isInstance)
                .map(Name::span)
                .findFirst()
                .orElse(subject.statement().span());
    }
}
