package irreproof.workspace;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A quick look at how a file is tied to others: whether it is a document of its own, what it includes, and which
 * document it says it belongs to ({@code % !TEX root = main.tex}, or {@code \documentclass[main]{subfiles}}). It only
 * serves to find the document a chapter belongs to; the reading proper is done by the latex layer.
 *
 * @param ownDocument it has a {@code \documentclass} and does not belong to another document
 * @param root the document it says it belongs to, as written
 */
record IncludeScan(boolean ownDocument, List<String> included, Optional<String> root) {
    private static final Pattern ROOT =
            Pattern.compile("(?im)^[ \t]*%+[ \t]*!T[eE]X[ \t]+root[ \t]*=[ \t]*(\\S.*?)[ \t]*$");
    private static final Pattern COMMENT = Pattern.compile("(?<!\\\\)%.*");
    private static final Pattern CLASS = Pattern.compile("\\\\documentclass\\s*(?:\\[([^\\]]*)\\])?\\s*\\{([^}]*)\\}");
    private static final Pattern INCLUDED =
            Pattern.compile("\\\\(?:input|include|subfile|subfileinclude)\\s*(?:\\{([^}]*)\\}|([^\\s\\\\{}%]+))");

    static IncludeScan of(String content) {
        Optional<String> root = first(ROOT.matcher(content), 1);
        String code = COMMENT.matcher(content).replaceAll("");
        Matcher documentClass = CLASS.matcher(code);
        boolean hasClass = documentClass.find();
        if (root.isEmpty() && hasClass && documentClass.group(2).strip().equals("subfiles")) {
            root = Optional.ofNullable(documentClass.group(1))
                    .map(String::strip)
                    .filter(name -> !name.isEmpty());
        }
        List<String> included = new ArrayList<>();
        for (Matcher matcher = INCLUDED.matcher(code); matcher.find(); ) {
            included.add((matcher.group(1) == null ? matcher.group(2) : matcher.group(1)).strip());
        }
        return new IncludeScan(hasClass && root.isEmpty(), List.copyOf(included), root);
    }

    private static Optional<String> first(Matcher matcher, int group) {
        return matcher.find() ? Optional.of(matcher.group(group)) : Optional.empty();
    }
}
