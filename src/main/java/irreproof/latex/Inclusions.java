package irreproof.latex;

import irreproof.text.SourceText;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;

/** Reads the files a document includes, for their definitions only. Each package once; cycles and depth are limited. */
final class Inclusions {
    private static final int DEEPEST = 20;
    private static final int MOST = 500;

    private final SourceProvider sources;
    private final Expander.Shared shared;
    private final Set<String> reading = new HashSet<>();
    private final Set<String> packages = new HashSet<>();
    private int files;

    Inclusions(SourceProvider sources, Expander.Shared shared) {
        this.sources = sources;
        this.shared = shared;
    }

    /** True if the word was an including command; it and its arguments are then used up. */
    boolean carryOut(Token word, Expander expander) {
        Arguments arguments = expander.arguments();
        switch (word.text()) {
            case "input", "include", "subfile":
                include(expander, fileName(expander), ".tex");
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
            if (packages.add(name.strip() + extension)) {
                sources.find(expander.path(), name.strip() + extension).ifPresent(file -> read(file, true));
            }
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

    private void include(Expander expander, String name, String extension) {
        if (name == null || name.isEmpty()) {
            return;
        }
        Optional<SourceText> file = sources.find(expander.path(), name);
        if (file.isEmpty() && !name.endsWith(extension)) {
            file = sources.find(expander.path(), name + extension);
        }
        file.ifPresent(found -> read(found, false));
    }

    /** Carries out what the file defines. */
    void read(SourceText file, boolean atIsLetter) {
        if (reading.size() >= DEEPEST || files >= MOST) {
            shared.report("too many files included, " + file.path() + " is left out");
            return;
        }
        if (!reading.add(file.path())) {
            return;
        }
        files++;
        Expander expander = new Expander(file.path(), file.content(), shared, this);
        expander.lexer().atIsLetter(atIsLetter);
        while (expander.next() != null) {
            // only what the file defines matters here
        }
        reading.remove(file.path());
    }

    /** The main document counts as being read, lest a file includes it. */
    void begin(String path) {
        reading.add(path);
    }
}
