package irreproof.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import irreproof.budget.Budget;
import irreproof.latex.LatexDocument;
import irreproof.latex.Passage;
import irreproof.latex.Reader;
import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;

/**
 * Fixture tables: some lines of LaTeX, then {@code => } and what is read in them. A source that holds no math shift and
 * no environment is set as a display. A line that begins with {@code %%} is a remark.
 */
final class Fixtures {
    private Fixtures() {}

    static List<Statement> statements(String latex) {
        String source = latex.contains("$") || latex.contains("\\begin") || latex.contains("\\[")
                ? latex
                : "\\[" + latex + "\\]";
        return statementsIn(source);
    }

    static List<Statement> statementsIn(String source) {
        LatexDocument document =
                Reader.read(new SourceText("test.tex", source), SourceProvider.none(), Budget.unlimited());
        List<Statement> statements = new ArrayList<>();
        for (Passage passage : document.passages()) {
            statements.addAll(StatementFinder.find(source, passage, Budget.unlimited()));
        }
        return statements;
    }

    static Stream<DynamicTest> table(String name) throws IOException {
        List<DynamicTest> tests = new ArrayList<>();
        StringBuilder source = new StringBuilder();
        for (String line : resource(name).split("\n")) {
            if (line.startsWith("%%") || line.isBlank() && source.isEmpty()) {
                continue;
            }
            if (line.startsWith("=> ")) {
                String latex = source.toString().stripTrailing();
                String expected = line.substring(3).strip();
                tests.add(DynamicTest.dynamicTest(latex, () -> reads(latex, expected)));
                source.setLength(0);
            } else {
                source.append(line).append('\n');
            }
        }
        assertFalse(tests.isEmpty(), name + " holds no fixtures");
        assertEquals("", source.toString(), name + " ends without a result");
        return tests.stream();
    }

    /** The line ends of the file make no difference. */
    private static void reads(String latex, String expected) {
        for (String lineEnd : List.of("\n", "\r\n", "\r")) {
            assertEquals(expected, Written.statements(statements(latex.replace("\n", lineEnd))));
        }
    }

    static String resource(String name) throws IOException {
        try (InputStream stream = Fixtures.class.getResourceAsStream("/notation/" + name)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
