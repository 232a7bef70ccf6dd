package irreproof.check;

import irreproof.engine.lie.Series;
import irreproof.naming.LieGroup;
import irreproof.naming.Resolution;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Predicate;

/**
 * The small groups that are tried where the text names none: SU(2) to SU(9), SO(7) to SO(16), Sp(4) to Sp(10) and the
 * exceptional groups, isomorphic algebras once. Only a statement that is true in one of them, in the usual reading,
 * counts.
 */
final class Inference {
    private static final List<Resolution.Simple> SMALL_GROUPS = smallGroups();

    private Inference() {}

    private static List<Resolution.Simple> smallGroups() {
        List<LieGroup> groups = new ArrayList<>();
        for (int n = 2; n <= 9; n++) {
            groups.add(LieGroup.su(n));
        }
        for (int n = 7; n <= 16; n++) {
            groups.add(LieGroup.so(n));
        }
        for (int n = 4; n <= 10; n += 2) {
            groups.add(LieGroup.sp(n));
        }
        groups.add(LieGroup.exceptional(Series.G, 2));
        groups.add(LieGroup.exceptional(Series.F, 4));
        groups.add(LieGroup.exceptional(Series.E, 6));
        groups.add(LieGroup.exceptional(Series.E, 7));
        groups.add(LieGroup.exceptional(Series.E, 8));
        return groups.stream().map(Resolution.Simple::new).toList();
    }

    /** The trial in the first small group in which the statement holds. */
    static <T> Optional<T> firstThatHolds(Function<Resolution.Simple, T> judge, Predicate<T> holds) {
        return SMALL_GROUPS.stream().map(judge).filter(holds).findFirst();
    }

    /** The trial in the only small group in which the statement holds; empty if there is none or more than one. */
    static <T> Optional<T> onlyOneThatHolds(Function<Resolution.Simple, T> judge, Predicate<T> holds) {
        List<T> found = SMALL_GROUPS.stream().map(judge).filter(holds).limit(2).toList();
        return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
    }
}
