package irreproof.latex;

/** Tells whether a source opens with a preamble, before anything in it is read. */
final class Preamble {
    private static final String BODY = "\\begin{document}";

    private Preamble() {}

    /** True if the body begins somewhere, behind a document class or at least before the first section. */
    static boolean opens(String text) {
        int body = find(text, BODY);
        if (body < 0) {
            return false;
        }
        int documentClass = find(text, "\\documentclass");
        if (documentClass >= 0 && documentClass < body) {
            return true;
        }
        int section = find(text, "\\section{");
        int chapter = find(text, "\\chapter{");
        return (section < 0 || section > body) && (chapter < 0 || chapter > body);
    }

    /** Where the command first stands outside a comment, or a negative number. */
    private static int find(String text, String command) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '\\') {
                if (text.startsWith(command, i)) {
                    return i;
                }
                i++;
            } else if (c == '%') {
                while (i + 1 < text.length() && !Lexer.isLineEnd(text.charAt(i + 1))) {
                    i++;
                }
            }
        }
        return -1;
    }
}
