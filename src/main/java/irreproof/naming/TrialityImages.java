package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The irreps of SO(8) that triality maps into each other share a number; {@code v}, {@code s}, {@code c} stand for the
 * nodes 1, 4, 3. An irrep that is symmetric under two of them carries the third letter (56v = (0,0,1,1)); if all three
 * labels differ, the letters of the two largest in order (224vs = (2,0,0,1)); a fully symmetric one has no subscript.
 * After Slansky (Phys. Rept. 79, 1981; from memory). Authors differ in which spinor is {@code s}, in whether 56s is in
 * 8v x 8s or in 8v x 8c, and some write {@code +} and {@code -}.
 */
record TrialityImages(TableOrder tieOrder) implements NameSharing {
    private static final String LETTERS = "vsc";
    private static final int[] NODES = {0, 3, 2};
    private static final int[][] PERMUTATIONS = {{0, 1, 2}, {0, 2, 1}, {1, 0, 2}, {2, 0, 1}, {1, 2, 0}, {2, 1, 0}};

    TrialityImages() {
        this(TableOrder.of(new SimpleAlgebra(Series.D, 4)));
    }

    @Override
    public List<Member> sharing(DominantWeight irrep) {
        List<Member> members = new ArrayList<>();
        for (int[] permutation : PERMUTATIONS) {
            int[] labels = irrep.labels();
            for (int i = 0; i < NODES.length; i++) {
                labels[NODES[i]] = irrep.label(NODES[permutation[i]]);
            }
            DominantWeight image = DominantWeight.of(labels);
            Member member = new Member(image, false, suffix(image));
            if (!members.contains(member)) {
                members.add(member);
            }
        }
        members.sort(Comparator.comparing(member -> rank(member.suffix())));
        return List.copyOf(members);
    }

    /** Orders v, s, c; then vs, vc, sv, sc, cv, cs. */
    private static String rank(String suffix) {
        return suffix.replace('v', 'a').replace('s', 'b');
    }

    private static String suffix(DominantWeight irrep) {
        int v = irrep.label(NODES[0]);
        int s = irrep.label(NODES[1]);
        int c = irrep.label(NODES[2]);
        if (v == s || s == c || c == v) {
            if (v == s && s == c) {
                return "";
            }
            return s == c ? "v" : v == c ? "s" : "c";
        }
        return LETTERS.chars()
                .boxed()
                .sorted(Comparator.comparing(letter -> -irrep.label(NODES[LETTERS.indexOf(letter)])))
                .limit(2)
                .map(Character::toString)
                .reduce("", String::concat);
    }

    /** A fully symmetric irrep may carry any letter: 28s is 28. */
    @Override
    public List<Candidate> read(List<Member> members, String written) {
        String suffix = written.equals("+") ? "s" : written.equals("-") ? "c" : written;
        List<Candidate> candidates = new ArrayList<>();
        boolean meaningful = members.size() > 1 && suffix.matches("[vsc]{1,2}");
        if (meaningful) {
            add(candidates, members, suffix, Custom.TABLES);
            add(candidates, members, swapSpinors(suffix), Custom.MIRRORED);
            add(candidates, members, new StringBuilder(suffix).reverse().toString(), Custom.MIRRORED);
        }
        if (candidates.isEmpty()) {
            for (Member member : members) {
                boolean usual = candidates.isEmpty() && !meaningful;
                candidates.add(new Candidate(member.irrep(), usual ? Custom.TABLES : Custom.MIRRORED));
            }
        }
        return candidates;
    }

    private static void add(List<Candidate> candidates, List<Member> members, String suffix, Custom custom) {
        for (Member member : members) {
            boolean known =
                    candidates.stream().anyMatch(candidate -> candidate.irrep().equals(member.irrep()));
            if (member.suffix().equals(suffix) && !known) {
                candidates.add(new Candidate(member.irrep(), custom));
            }
        }
    }

    private static String swapSpinors(String suffix) {
        return suffix.replace('s', '?').replace('c', 's').replace('?', 'c');
    }
}
