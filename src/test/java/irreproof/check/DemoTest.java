package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The demo manuscript: every mistake that a comment announces ({@code % planted: RULE}) is found within the lines below
 * it, in this order, and nothing else is.
 */
class DemoTest {
    private static final Path DEMO = Path.of("src", "demo");
    private static final Pattern PLANTED = Pattern.compile("% planted: ([a-z-]+)");
    private static final int LINES_BELOW = 3;

    @ParameterizedTest
    @ValueSource(strings = {"lantern.tex", "spinors.tex", "clean.tex", "macros.tex"})
    void findsWhatWasPlantedAndNothingElse(String name) throws IOException {
        SourceText source = new SourceText(name, Files.readString(DEMO.resolve(name)));
        SourceProvider folder = (from, included) -> {
            Path file = DEMO.resolve(included + ".tex");
            try {
                return Files.exists(file)
                        ? Optional.of(new SourceText(included, Files.readString(file)))
                        : Optional.empty();
            } catch (IOException failure) {
                throw new AssertionError(failure);
            }
        };
        CheckOptions options = new CheckOptions("", folder, CheckOptions.DEFAULT_STEPS, true);
        FileReport report = Checker.check(source, options, Budget.unlimited());

        List<String> planted = new ArrayList<>();
        List<Integer> lines = new ArrayList<>();
        Matcher comment = PLANTED.matcher(source.content());
        while (comment.find()) {
            planted.add(comment.group(1));
            lines.add(source.lines().position(comment.start()).line());
        }
        List<String> found = report.allFindings().stream().map(Finding::rule).toList();
        assertEquals(planted, found);
        for (int i = 0; i < planted.size(); i++) {
            int line = source.lines()
                    .position(report.allFindings().get(i).span().start())
                    .line();
            assertEquals(true, line > lines.get(i) && line <= lines.get(i) + LINES_BELOW, "line " + (line + 1));
        }
    }
}
