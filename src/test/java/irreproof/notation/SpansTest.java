package irreproof.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.text.Span;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/**
 * Where statements, sides, names, relations and problems stand: carets under the source, one run for each. Findings point
 * there and fixes replace exactly this.
 */
class SpansTest {
    @TestFactory
    Stream<DynamicTest> everythingStandsWhereTheAuthorWroteIt() throws IOException {
        List<DynamicTest> tests = new ArrayList<>();
        String kind = null;
        List<String> lines = new ArrayList<>();
        for (String line : (Fixtures.resource("spans.txt") + "\n=> end").split("\n")) {
            if (line.startsWith("=> ")) {
                if (kind != null) {
                    tests.add(test(kind, List.copyOf(lines)));
                }
                kind = line.substring(3).strip();
                lines.clear();
            } else if (!line.startsWith("%%") && !line.isBlank()) {
                lines.add(line);
            }
        }
        return tests.stream();
    }

    private static DynamicTest test(String kind, List<String> lines) {
        StringBuilder source = new StringBuilder();
        List<Span> expected = new ArrayList<>();
        int lineStart = 0;
        for (String line : lines) {
            if (line.replace('^', ' ').isBlank()) {
                expected.addAll(marked(line, lineStart));
            } else {
                lineStart = source.length();
                source.append(line).append('\n');
            }
        }
        String text = source.toString();
        return DynamicTest.dynamicTest(
                kind + " " + text, () -> assertEquals(show(expected, text), show(found(kind, text), text)));
    }

    private static List<Span> marked(String carets, int lineStart) {
        List<Span> spans = new ArrayList<>();
        int start = carets.indexOf('^');
        while (start >= 0) {
            int end = start;
            while (end < carets.length() && carets.charAt(end) == '^') {
                end++;
            }
            spans.add(new Span(lineStart + start, lineStart + end));
            start = carets.indexOf('^', end);
        }
        return spans;
    }

    private static List<Span> found(String kind, String text) {
        List<Span> found = new ArrayList<>();
        for (Statement statement : Fixtures.statementsIn(text)) {
            switch (kind) {
                case "statements" -> found.add(statement.span());
                case "sides" -> statement.sides().forEach(side -> found.add(side.span()));
                case "names" -> statement.sides().forEach(side -> names(side, found));
                case "relations" -> statement.relations().forEach(relation -> found.add(relation.span()));
                case "problems" -> statement.problems().forEach(problem -> found.add(problem.span()));
                default -> throw new IllegalArgumentException("unknown fixture: " + kind);
            }
        }
        found.sort(Comparator.comparingInt(Span::start));
        return found;
    }

    private static void names(Expression tree, List<Span> found) {
        if (tree instanceof Expression.Name) {
            found.add(tree.span());
        } else {
            Trees.children(tree).forEach(child -> names(child, found));
        }
    }

    private static String show(List<Span> spans, String text) {
        return spans.stream().map(span -> span.start() + " " + span.of(text)).collect(Collectors.joining("\n"));
    }
}
