package irreproof.latex;

import java.util.Map;
import java.util.Set;

/** What is known of the usual environments: which hold mathematics, which make rows, which arguments follow. */
final class MathEnvironments {
    private static final Set<String> DISPLAYS = Set.of(
            "equation",
            "displaymath",
            "math",
            "align",
            "gather",
            "multline",
            "flalign",
            "alignat",
            "xalignat",
            "xxalignat",
            "eqnarray",
            "IEEEeqnarray",
            "dmath",
            "dgroup",
            "empheq");
    private static final Set<String> TABLES = Set.of(
            "tabular", "tabularx", "tabulary", "tabu", "longtable", "longtabu", "supertabular", "xltabular", "tblr");
    private static final Set<String> LAYOUTS = Set.of(
            "aligned",
            "alignedat",
            "gathered",
            "split",
            "multlined",
            "array",
            "cases",
            "dcases",
            "rcases",
            "IEEEeqnarraybox",
            "eqnarray",
            "align",
            "gather",
            "multline",
            "alignat",
            "flalign");
    /** {@code o} an optional argument, {@code m} a mandatory one, of environments inside and outside mathematics. */
    private static final Map<String, String> ARGUMENTS = Map.ofEntries(
            Map.entry("array", "om"),
            Map.entry("subarray", "m"),
            Map.entry("aligned", "o"),
            Map.entry("gathered", "o"),
            Map.entry("multlined", "oo"),
            Map.entry("alignedat", "om"),
            Map.entry("alignat", "m"),
            Map.entry("xalignat", "m"),
            Map.entry("xxalignat", "m"),
            Map.entry("IEEEeqnarray", "om"),
            Map.entry("IEEEeqnarraybox", "om"),
            Map.entry("empheq", "om"),
            Map.entry("dmath", "o"),
            Map.entry("ytableau", "o"),
            Map.entry("tikzcd", "o"),
            Map.entry("tabular", "om"),
            Map.entry("tabularx", "mom"),
            Map.entry("tabulary", "mom"),
            Map.entry("xltabular", "mom"),
            Map.entry("tabu", "m"),
            Map.entry("longtabu", "m"),
            Map.entry("tblr", "om"),
            Map.entry("longtable", "om"),
            Map.entry("supertabular", "m"),
            Map.entry("figure", "o"),
            Map.entry("table", "o"),
            Map.entry("minipage", "ooom"),
            Map.entry("wrapfigure", "omom"),
            Map.entry("multicols", "m"),
            Map.entry("thebibliography", "m"),
            Map.entry("enumerate", "o"),
            Map.entry("itemize", "o"),
            Map.entry("list", "mm"),
            Map.entry("adjustbox", "m"),
            Map.entry("tikzpicture", "o"));

    private MathEnvironments() {}

    private static String plain(String name) {
        return name.endsWith("*") ? name.substring(0, name.length() - 1) : name;
    }

    static boolean isDisplay(String name) {
        return DISPLAYS.contains(plain(name));
    }

    static boolean isTable(String name) {
        return TABLES.contains(plain(name));
    }

    /** True if the environment's rows are the rows of the formula when nothing stands beside it. */
    static boolean isLayout(String name) {
        return LAYOUTS.contains(plain(name));
    }

    static String arguments(String name) {
        if (name.equals("tabular*")) {
            return "mom";
        }
        return ARGUMENTS.getOrDefault(plain(name), "");
    }
}
