package irreproof.latex;

import irreproof.text.SourceText;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;

/**
 * Reads the files a document includes, for their definitions only. Each package is read once; cycles, depth and number
 * are limited. A file that is not found says nothing: most packages are installed ones.
 */
final class Inclusions {
    private static final int DEEPEST = 20;
    private static final int MOST = 500;

    private final SourceProvider sources;
    private final Reading common;
    private final String main;
    private final Set<String> reading = new HashSet<>();
    private final Set<String> packages = new HashSet<>();
    private int files;
    /** True while the body of the document that the main source belongs to is being read. */
    private boolean insideRootBody;

    private boolean reachedMain;

    /** @param main the path of the document that is read; a file that includes it does not make it read twice */
    Inclusions(String main, SourceProvider sources, Reading common) {
        this.main = main;
        this.sources = sources;
        this.common = common;
    }

    /** True if the word was an including command; it and its arguments are then used up. */
    boolean carryOut(Token word, Expander expander) {
        switch (word.text()) {
            case "input":
                include(expander, true);
                return true;
            case "include", "subfile":
                include(expander, !insideRootBody);
                return true;
            case "usepackage", "RequirePackage":
                packages(expander, ".sty");
                return true;
            case "documentclass", "LoadClass":
                packages(expander, ".cls");
                return true;
            default:
                return false;
        }
    }

    private void packages(Expander expander, String extension) {
        Arguments arguments = expander.arguments();
        arguments.optional();
        String names = arguments.name();
        arguments.optional();
        if (names == null) {
            return;
        }
        for (String name : names.split(",")) {
            String file = name.strip() + extension;
            if (packages.add(file)) {
                sources.find(expander.path(), file).ifPresent(found -> read(found, true));
            }
        }
    }

    private void include(Expander expander, boolean wanted) {
        String name = fileName(expander);
        if (name == null || name.isEmpty()) {
            return;
        }
        Optional<SourceText> file = sources.find(expander.path(), name);
        if (file.isEmpty() && !name.endsWith(".tex")) {
            file = sources.find(expander.path(), name + ".tex");
        }
        if (file.isEmpty()) {
            return;
        }
        if (file.get().path().equals(main)) {
            reachedMain = true;
        } else if (wanted) {
            read(file.get(), false);
        }
        if (reachedMain) {
            expander.stop();
        }
    }

    /** In braces, or bare up to a blank. */
    private static String fileName(Expander expander) {
        Token token = expander.raw();
        while (token != null && token.kind() == TokenKind.SPACE) {
            token = expander.raw();
        }
        if (token != null && token.kind() == TokenKind.BEGIN_GROUP) {
            expander.push(token);
            return expander.arguments().name();
        }
        StringBuilder name = new StringBuilder();
        while (token != null
                && (token.kind() == TokenKind.LETTER
                        || token.kind() == TokenKind.DIGIT
                        || token.kind() == TokenKind.OTHER
                        || token.kind() == TokenKind.SUBSCRIPT)) {
            name.append(token.text());
            token = expander.raw();
        }
        expander.push(token);
        return name.toString();
    }

    /** Carries out what the file defines. */
    private void read(SourceText file, boolean atIsLetter) {
        if (reading.contains(file.path())) {
            return;
        }
        if (reading.size() >= DEEPEST || files >= MOST) {
            common.report("too many files are included; " + file.path() + " is left out");
            return;
        }
        files++;
        reading.add(file.path());
        Expander expander = new Expander(file.path(), file.content(), common, this);
        expander.lexer().atIsLetter(atIsLetter);
        while (expander.next() != null) {
            // only what the file defines matters here
        }
        reading.remove(file.path());
    }

    /**
     * Carries out what the document that the main source belongs to defines before it includes the main source. Other
     * chapters are left out: to read a whole book for each of its chapters would take too long.
     */
    void readRoot(SourceText root) {
        reading.add(root.path());
        reachedMain = root.path().equals(main);
        Expander expander = new Expander(root.path(), root.content(), common, this);
        while (!reachedMain) {
            Token token = expander.next();
            if (token == null
                    || token.isWord("end")
                            && "document".equals(expander.arguments().name())) {
                break;
            }
            insideRootBody |= token.isWord("begin")
                    && "document".equals(expander.arguments().name());
        }
        insideRootBody = false;
        reachedMain = false;
        reading.remove(root.path());
    }
}
