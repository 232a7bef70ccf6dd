package irreproof.naming;

import irreproof.notation.GroupName;
import java.util.Collection;
import java.util.Locale;

/** What an author counts by the n of Sp(n). USp(2n) always counts the size of the matrices. */
public enum SymplecticUsage {
    /** The size of the matrices: Sp(4) is of rank 2. Then every n is even. */
    SIZE,
    /** The rank: Sp(2) is of rank 2. */
    RANK;

    /**
     * The usage that an author's mentions of groups show: an odd n, as in Sp(1), or two numbers, as in Sp(1,1), can only
     * count the rank. Without such a mention {@link #SIZE}.
     */
    public static SymplecticUsage of(Collection<GroupName> mentions) {
        return mentions.stream().anyMatch(SymplecticUsage::countsRank) ? RANK : SIZE;
    }

    /** This, unless the name itself can only count the rank. */
    SymplecticUsage with(GroupName name) {
        return countsRank(name) ? RANK : this;
    }

    private static boolean countsRank(GroupName name) {
        return name.factors().stream()
                .filter(factor -> factor.family().toUpperCase(Locale.ROOT).equals("SP"))
                .map(GroupName.Factor::arguments)
                .anyMatch(arguments -> arguments.size() == 2 || arguments.size() == 1 && arguments.get(0) % 2 != 0);
    }
}
