package irreproof.corpus;

import com.google.gson.Gson;
import com.google.gson.JsonObject;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.regex.Pattern;

/** One statement of the corpus, out of its document. */
record SeenStatement(String id, String latex, String group, String kind, String notation, String truth) {
    private static final Pattern SIMPLE =
            Pattern.compile("(SU|SO|Sp)\\(\\d+\\)( colour| isospin)?|SO\\(6\\)=SU\\(4\\)|G2|F4|E[678]");

    /** What the authors' own preambles define. */
    private static final String MACROS = """
            \\renewcommand{\\v}{\\boldsymbol{8_v}}
            \\newcommand{\\s}{\\boldsymbol{8_s}}
            \\renewcommand{\\c}{\\boldsymbol{8_c}}
            \\renewcommand{\\i}{\\boldsymbol{1}}
            \\newcommand{\\seven}{\\boldsymbol{7}}
            \\newcommand{\\eight}{\\boldsymbol{8}}
            \\newcommand{\\SO}{\\mathrm{SO}}
            """;

    static List<SeenStatement> all() {
        try (InputStream stream = SeenStatement.class.getResourceAsStream("/corpus/seen.jsonl")) {
            Gson gson = new Gson();
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .map(line -> gson.fromJson(line, JsonObject.class))
                    .map(SeenStatement::of)
                    .toList();
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    private static SeenStatement of(JsonObject json) {
        return new SeenStatement(
                json.get("id").getAsString(),
                json.get("latex").getAsString(),
                json.get("group").getAsString(),
                json.get("kind").getAsString(),
                json.get("notation").getAsString(),
                json.get("truth").getAsString());
    }

    boolean isProductOfSimpleGroup() {
        return kind.equals("product") && SIMPLE.matcher(group).matches();
    }

    boolean hasTruth() {
        return truth.equals("true") || truth.equals("false");
    }

    /** A small document that names the group and sets the statement as its author did. */
    String document() {
        return "\\documentclass{article}\n" + MACROS + "\\begin{document}\nFor " + announcement() + " one has\n"
                + passage() + "\n\\end{document}\n";
    }

    private String passage() {
        if (latex.startsWith("$")) {
            boolean cut = latex.contains("$}");
            String opened = cut ? "\\multicolumn{1}{|c|}{" + latex + "}" : latex;
            return "\\begin{tabular}{lllll}\n" + opened + " \\\\\n\\end{tabular}";
        }
        boolean rows = latex.contains("&") && !latex.contains("\\begin{split}");
        String environment = rows ? "align" : "equation";
        return "\\begin{" + environment + "}\n" + latex + "\n\\end{" + environment + "}";
    }

    /** The group in LaTeX, as an author would name it in the sentence before. */
    private String announcement() {
        String named = group.replaceAll("\\((?!\\d+\\)|\\d+,|N|2l|2,C)[^()]*(\\([^()]*\\)[^()]*)*\\)$", "")
                .replaceAll(" (isospin|colour|of the molecule)", "")
                .replaceAll("point groups?", "the point group")
                .replaceAll("\\?", "")
                .strip();
        String latex = named.replaceAll("\\b([EFGA])(\\d)\\b", "$1_$2")
                .replaceAll("\\b([CD])(\\d)([vh]?)\\b", "$1_{$2$3}")
                .replaceAll("\\bOh\\b", "O_h")
                .replaceAll("\\bTd\\b", "T_d")
                .replace("->", " \\to ")
                .replaceAll("(?<=\\)|\\d)x(?=[A-Z])", " \\\\times ");
        return latex.startsWith("the") ? latex : "$" + latex.replaceAll("[=/]", "\\$ or \\$") + "$";
    }
}
