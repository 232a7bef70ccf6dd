package irreproof.notation;

import java.util.regex.Pattern;

/** Whether the words beside a name say that it is a group: for names that could be anything else. */
final class GroupContext {
    private static final int REACH = 48;
    private static final Pattern BEHIND = Pattern.compile("^[-\\s]*(?:(?:flavou?r|discrete|finite|modular|point|family"
            + "|horizontal|gauge|global|local|non-[Aa]belian|[Aa]belian|symmetric|alternating|dihedral|cyclic|tetrahedral"
            + "|octahedral|icosahedral|[Ll]ie|simple|exceptional|colou?r|rotation|crystal|molecular|permutation|double|binary)"
            + "[-\\s]+){0,3}"
            + "(?:groups?|subgroups?|algebras?|subalgebras?|symmetry|symmetries|irreps?|representations?|singlets?|doublets?"
            + "|triplets?|multiplets?|flavou?r|invariant|invariance|models?|characters?)\\b.*");
    private static final Pattern ENUMERATION = Pattern.compile("\\s*(?:,|and|or|,\\s*and|,\\s*or|→|⊃|⊂)\\s*");
    private static final Pattern BEFORE =
            Pattern.compile(".*\\b(?:groups?|subgroups?|algebras?|subalgebras?|symmetry|symmetries"
                    + "|irreps? of|representations? of|multiplets? of|singlets? of|doublets? of|triplets? of|invariant under|under)"
                    + "(?:\\s+(?:the|is|are|of|by|a|an|called))*[\\s(:=]*$");

    private GroupContext() {}

    static boolean speaksOfGroups(String text, int start, int end) {
        String before = oneLine(text.substring(Math.max(0, start - REACH), start));
        String behind = oneLine(text.substring(end, Math.min(text.length(), end + REACH)));
        return BEHIND.matcher(behind).matches() || BEFORE.matcher(before).matches();
    }

    /** True if nothing but "and" or the like stands between a group and a name. */
    static boolean isEnumerated(String text, int groupEnd, int start) {
        return groupEnd <= start
                && start - groupEnd < REACH
                && ENUMERATION.matcher(text.substring(groupEnd, start)).matches();
    }

    /** Stops at a paragraph break and treats line ends as blanks. */
    private static String oneLine(String text) {
        return text.replace("\n\n", "\u0001").replace('\n', ' ');
    }
}
