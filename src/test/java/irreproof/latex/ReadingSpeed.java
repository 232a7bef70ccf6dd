package irreproof.latex;

import irreproof.budget.Budget;
import irreproof.text.SourceText;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Locale;

/**
 * Prints how fast a manuscript is read, in millions of characters a second of processor time: the lexer alone, and the whole reader. Not a
 * test. Run with the test classes on the class path; the argument is the size in millions of characters (default 5).
 */
final class ReadingSpeed {
    private static final int ROUNDS = 8;
    private static final String PREAMBLE = """
            \\documentclass{article}
            \\newcommand{\\rep}[1]{\\mathbf{#1}}
            \\newcommand{\\SU}[1]{\\mathrm{SU}(#1)}
            \\begin{document}
            """;
    private static final String PAGE = """
            \\section{Products in $\\SU{3}$}
            The states of two quarks fall into representations of the flavour group, which we take to be $\\SU{3}$
            throughout. A product of two triplets, for example, holds the antitriplet in its antisymmetric part, and
            so the diquark transforms as an antiquark does. % a remark on the side
            \\begin{equation}\\label{eq:products}
              \\rep{3}\\otimes\\rep{3} = \\rep{6}\\oplus\\overline{\\rep{3}},\\qquad
              \\rep{8}\\otimes\\rep{8} = \\rep{27}\\oplus\\rep{10}\\oplus\\overline{\\rep{10}}\\oplus 2\\,\\rep{8}\\oplus\\rep{1}.
            \\end{equation}
            Here the bar denotes the conjugate, and $\\rep{8}$ is the adjoint, as in~\\cite{ref}; compare the discussion
            in section~\\ref{sec:two}, where the same is done for the larger groups that unify these interactions.

            """;

    private ReadingSpeed() {}

    public static void main(String[] arguments) {
        double size = arguments.length == 0 ? 5 : Double.parseDouble(arguments[0]);
        StringBuilder text = new StringBuilder(PREAMBLE);
        while (text.length() < size * 1e6) {
            text.append(PAGE);
        }
        String manuscript = text.append("\\end{document}\n").toString();
        SourceText source = new SourceText("manuscript.tex", manuscript);
        ThreadMXBean clock = ManagementFactory.getThreadMXBean();
        for (int round = 1; round <= ROUNDS; round++) {
            long start = clock.getCurrentThreadCpuTime();
            Lexer lexer = new Lexer(manuscript);
            int tokens = 0;
            while (lexer.next() != null) {
                tokens++;
            }
            long lexed = clock.getCurrentThreadCpuTime();
            LatexDocument document = Reader.read(source, SourceProvider.none(), Budget.unlimited());
            long read = clock.getCurrentThreadCpuTime();
            System.out.printf(
                    Locale.ROOT,
                    "round %d: %d tokens lexed at %.1f MB/s; %d passages read at %.1f MB/s%n",
                    round,
                    tokens,
                    manuscript.length() * 1e3 / (lexed - start),
                    document.passages().size(),
                    manuscript.length() * 1e3 / (read - lexed));
        }
    }
}
