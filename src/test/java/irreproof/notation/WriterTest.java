package irreproof.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Sum;
import irreproof.notation.WrittenTerm.Diagram;
import irreproof.notation.WrittenTerm.Dimension;
import irreproof.notation.WrittenTerm.Labels;
import irreproof.notation.WrittenTerm.Spin;
import irreproof.notation.WrittenTerm.WrittenName;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class WriterTest {
    private static final String MACROS =
            "\\newcommand{\\rep}[1]{\\mathbf{#1}}\\newcommand{\\repbar}[1]{\\overline{\\mathbf{#1}}}"
                    + "\\newcommand{\\directsum}{\\oplus}\\newcommand{\\seven}{\\boldsymbol{7}}\\newcommand{\\Y}[1]{\\yng(#1)}\n";

    /** What an author wrote, and how {@code 3 + ~10 + 2 x 8 + 15'} then looks. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            \\mathbf{3}\\otimes\\mathbf{3}=\\mathbf{6}\\oplus\\bar{\\mathbf{3}} | \
            \\mathbf{3}\\oplus\\bar{\\mathbf{10}}\\oplus\\mathbf{8}\\oplus\\mathbf{8}\\oplus\\mathbf{15}'
            \\mathbf 3 \\otimes \\mathbf 3 = \\mathbf 6 \\oplus \\overline{\\mathbf{10}} | \
            \\mathbf 3 \\oplus \\overline{\\mathbf{10}} \\oplus \\mathbf {8} \\oplus \\mathbf 8 \\oplus \\mathbf {15}'
            3\\otimes3=6+\\bar 3 | 3+\\bar {10}+8+8+15'
            3\\times 3=\\overline{10}+2\\cdot 8+\\mathbf{1} | 3+\\overline{10}+2\\cdot 8+15'
            \\rep{3} \\otimes \\rep{8}=\\rep{\\bar 6} \\directsum 2\\,\\rep{15'} | \
            \\rep{3} \\directsum \\rep{\\bar {10}} \\directsum 2\\,\\rep{8} \\directsum \\rep{15'}
            \\rep{3}\\otimes\\repbar{3}=\\rep{8} | \\rep{3}\\oplus\\repbar{10}\\oplus\\rep{8}\\oplus\\rep{8}\\oplus\\rep{15}'
            {\\bf 3}\\otimes{\\bf 3}^*={\\bf 6}\\oplus2\\times{\\bf 15}^\\prime | \
            {\\bf 3}\\oplus{\\bf 10}^*\\oplus2\\times{\\bf 8}\\oplus{\\bf 15}^\\prime
            \\underline{3}\\otimes\\underline{3} | \
            \\underline{3}\\oplus\\overline{\\underline{10}}\\oplus\\underline{8}\\oplus\\underline{8}\\oplus\\underline{15}'
            \\bar{3}\\otimes\\overline{10} | 3\\oplus\\overline{10}\\oplus8\\oplus8\\oplus15'
            """)
    void writesInTheAuthorsStyle(String latex, String expected) {
        List<WrittenTerm> terms = List.of(
                one(dimension(3, 0, 0)), one(dimension(10, 1, 0)), two(dimension(8, 0, 0)), one(dimension(15, 0, 1)));
        assertEquals(expected.replace("\\mathbf {8} ", "\\mathbf 8 "), Writer.sum(terms, style(latex)));
    }

    @Test
    void takesUpNamesAsTheyWereWritten() {
        assertEquals(
                "\\seven\\oplus\\boldsymbol{8_v}\\oplus\\boldsymbol{56_s}",
                Writer.sum(
                        List.of(one(dimension(7, 0, 0)), one(labelled(8, "v")), one(labelled(56, "s"))),
                        style("\\seven\\otimes\\boldsymbol{8_v}=\\boldsymbol{1}")));
    }

    @Test
    void learnsFromOtherStatementsWhatThisOneDoesNotShow() {
        String source =
                MACROS + "$\\rep{3}\\otimes\\rep{3}$ and $\\repbar{3}\\otimes\\rep{3}=\\rep{1}\\directsum\\rep{8}$";
        AuthorStyle style = AuthorStyle.learn(source, Fixtures.statementsIn(source));
        assertEquals(
                "\\rep{6}\\directsum\\repbar{3}",
                Writer.sum(List.of(one(dimension(6, 0, 0)), one(dimension(3, 1, 0))), style));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            (1,0)\\otimes(0,1)=(1,1)\\oplus(0,0) | (2,1)\\oplus(0,3)
            [1,\\,0]\\otimes[0,\\,1] | [2,\\,1]\\oplus[0,\\,3]
            (1\\,0)\\otimes(0\\,1) | (2\\,1)\\oplus(0\\,3)
            \\left(1, 0\\right)\\otimes\\left(0, 1\\right) | \\left(2, 1\\right)\\oplus\\left(0, 3\\right)
            3\\otimes3=6 | (2,1)\\oplus(0,3)
            """)
    void writesDynkinLabels(String latex, String expected) {
        List<WrittenTerm> terms = List.of(one(new Labels(List.of(2, 1))), one(new Labels(List.of(0, 3))));
        assertEquals(expected, Writer.sum(terms, style(latex)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            \\yng(1)\\otimes\\yng(1) | \\yng(2,1)\\oplus\\bullet
            \\ydiagram{1}\\otimes\\ydiagram{1}=\\cdot\\oplus\\ydiagram{2} | \\ydiagram{2,1}\\oplus\\cdot
            \\Y{2}\\otimes\\Y{1,1} | \\Y{2,1}\\oplus\\bullet
            \\young(\\hfil)\\otimes\\young(a) | \\yng(2,1)\\oplus\\bullet
            """)
    void writesDiagrams(String latex, String expected) {
        List<WrittenTerm> terms = List.of(one(new Diagram(List.of(2, 1))), one(new Diagram(List.of())));
        assertEquals(expected, Writer.sum(terms, style(latex)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            1/2\\otimes1/2=0\\oplus1 | 0\\oplus3/2
            \\frac12\\otimes1 | 0\\oplus\\frac32
            \\mathbf{\\tfrac{1}{2}}\\otimes\\mathbf{1} | \\mathbf{0}\\oplus\\mathbf{\\tfrac{3}{2}}
            1\\otimes1 = 1 | 0\\oplus\\tfrac{3}{2}
            """)
    void writesSpins(String latex, String expected) {
        assertEquals(expected, Writer.sum(List.of(one(new Spin(0)), one(new Spin(3))), style(latex)));
    }

    static Stream<String> authors() {
        return Stream.of(
                "\\mathbf{3}\\otimes\\mathbf{3}=\\mathbf{6}\\oplus\\bar{\\mathbf{3}}",
                "\\bm{3} \\otimes \\bm{3} = \\bm{6} \\oplus \\bm{\\bar{3}}\\oplus\\bm{15'}",
                "3\\otimes3=6\\oplus\\bar3",
                "3\\times3\\otimes1=6+\\overline{10}+2\\cdot8",
                "{\\bf 3}\\otimes{\\bf\\bar 3}={\\bf 1}\\oplus{\\bf 8}",
                "\\bf 3\\otimes\\bar 3=1\\oplus 8",
                "\\rep{3}\\otimes\\rep{8}=\\rep{\\bar 6}\\directsum 2\\,\\rep{15'}",
                "\\rep 3\\otimes\\rep 8=\\repbar 6\\directsum 2\\rep{15}^\\prime",
                "\\mathbf{3}\\otimes\\mathbf{10}^*=2\\times\\mathbf{15}^{\\prime\\prime}+\\mathbf{8}'",
                "\\underline{3}\\otimes\\underline{\\bar 3}=\\underline{8}\\oplus\\underline{1}",
                "\\boldsymbol{8_{\\rm v}}\\otimes\\boldsymbol{8_{\\rm s}}=\\seven\\oplus\\boldsymbol{56_{\\rm c}}",
                "\\mathbf{8}_{\\mathrm{v}}\\otimes\\mathbf{8}_{\\mathrm{s}}=\\mathbf{8}_{\\mathrm{c}}\\oplus\\mathbf{56}_{\\mathrm{c}}",
                "8_v\\otimes8_s=8_c\\oplus56_c'");
    }

    @ParameterizedTest
    @MethodSource("authors")
    void readingWhatWasWrittenGivesTheSameNames(String latex) {
        long seed = 20260210;
        Random random = new Random(seed);
        for (int round = 0; round < 40; round++) {
            List<WrittenTerm> terms = new ArrayList<>();
            int size = 1 + random.nextInt(6);
            for (int i = 0; i < size; i++) {
                terms.add(new WrittenTerm(BigInteger.valueOf(1 + random.nextInt(7)), randomName(random)));
            }
            rereads(latex, terms, "seed " + seed + ", round " + round);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            (1,0)\\otimes(0,1)=(1,1)\\oplus(0,0)
            [1\\,0]\\otimes[0\\,1]=2[1\\,1]
            \\yng(1)\\otimes\\yng(1)=\\yng(2)\\oplus\\cdot
            \\ydiagram{1}\\otimes\\ydiagram{1}=3\\,\\ydiagram{2}
            """)
    void readingListsAndDiagramsGivesTheSame(String latex) {
        boolean diagrams = latex.contains("y");
        List<WrittenTerm> terms = new ArrayList<>();
        for (int i = 0; i < 5; i++) {
            terms.add(new WrittenTerm(
                    BigInteger.valueOf(1 + 2 * i),
                    diagrams ? new Diagram(i == 0 ? List.of() : List.of(i, i)) : new Labels(List.of(i, 2 * i))));
        }
        rereads(latex, terms, latex);
    }

    private static void rereads(String latex, List<WrittenTerm> terms, String message) {
        String source = MACROS + "\\[" + latex + "\\]";
        Statement statement = Fixtures.statementsIn(source).get(0);
        String written = Writer.sum(terms, AuthorStyle.learn(source, List.of(statement)));
        Expression right = statement.sides().get(1);
        String mended = source.substring(0, right.span().start())
                + written
                + source.substring(right.span().end());
        List<Statement> again = Fixtures.statementsIn(mended);
        assertEquals(1, again.size(), () -> message + ": " + mended);
        assertEquals(List.of(), again.get(0).problems(), () -> message + ": " + mended);
        assertEquals(counted(terms), counted(again.get(0).sides().get(1)), () -> message + ": " + mended);
    }

    private static TreeMap<String, BigInteger> counted(List<WrittenTerm> terms) {
        TreeMap<String, BigInteger> counts = new TreeMap<>();
        terms.forEach(term -> counts.merge(term.name().toString(), term.count(), BigInteger::add));
        return counts;
    }

    private static TreeMap<String, BigInteger> counted(Expression side) {
        TreeMap<String, BigInteger> counts = new TreeMap<>();
        List<Expression> terms = side instanceof Sum sum ? sum.terms() : List.of(side);
        for (Expression term : terms) {
            BigInteger count = term instanceof Multiple multiple ? multiple.count() : BigInteger.ONE;
            Expression name = term instanceof Multiple multiple ? multiple.body() : term;
            counts.merge(name(name).toString(), count, BigInteger::add);
        }
        return counts;
    }

    private static WrittenName name(Expression tree) {
        if (tree instanceof NumberName number) {
            Decoration decoration = number.decoration();
            assertEquals(Set.of(""), Set.of(decoration.other()));
            return new Dimension(number.numerator(), decoration.bars(), decoration.primes(), decoration.label());
        }
        if (tree instanceof ListName list) {
            return new Labels(list.entries().stream()
                    .map(entry -> ((NumberName) entry).numerator().intValueExact())
                    .toList());
        }
        return new Diagram(((DiagramName) tree).rows());
    }

    private static WrittenName randomName(Random random) {
        int[] dimensions = {1, 3, 8, 10, 15, 105, 2310};
        String[] labels = {"", "", "", "v", "s", "vs"};
        return new Dimension(
                BigInteger.valueOf(dimensions[random.nextInt(dimensions.length)]),
                random.nextInt(2),
                random.nextInt(3) % 3,
                labels[random.nextInt(labels.length)]);
    }

    private static AuthorStyle style(String latex) {
        String source = MACROS + "\\[" + latex + "\\]";
        return AuthorStyle.learn(source, Fixtures.statementsIn(source));
    }

    private static WrittenTerm one(WrittenName name) {
        return new WrittenTerm(BigInteger.ONE, name);
    }

    private static WrittenTerm two(WrittenName name) {
        return new WrittenTerm(BigInteger.TWO, name);
    }

    private static Dimension dimension(long dimension, int bars, int primes) {
        return new Dimension(BigInteger.valueOf(dimension), bars, primes, "");
    }

    private static Dimension labelled(long dimension, String label) {
        return new Dimension(BigInteger.valueOf(dimension), 0, 0, label);
    }
}
