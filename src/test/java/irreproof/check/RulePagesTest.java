package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

class RulePagesTest {
    private static final Pattern EXAMPLE = Pattern.compile("```tex\\n(.*?)```", Pattern.DOTALL);

    /** Each page's example shows what the page says: it breaks that rule and no other. */
    @TestFactory
    Stream<DynamicTest> exampleBreaksItsRule() {
        return Rules.all().stream()
                .filter(rule -> !rule.name().equals(Rules.CRASH))
                .map(rule -> DynamicTest.dynamicTest(rule.name(), () -> {
                    Matcher example = EXAMPLE.matcher(rule.page());
                    assertTrue(example.find(), "an example");
                    List<Finding> findings =
                            Fixture.report(example.group(1), "").allFindings();
                    assertEquals(
                            List.of(rule.name()),
                            findings.stream().map(Finding::rule).distinct().toList());
                    assertEquals(rule.severity(), findings.get(0).severity());
                }));
    }

    @Test
    void pagesHaveTheSameParts() {
        for (RuleInfo rule : Rules.all()) {
            assertTrue(rule.page().startsWith("# " + rule.name() + "\n"), rule.name());
            for (String part : List.of("What it checks", "Why", "Example", "Limits")) {
                assertTrue(rule.page().contains("\n## " + part + "\n"), rule.name() + ": " + part);
            }
            assertTrue(rule.summary().length() > 10 && !rule.summary().endsWith("."), rule.name());
        }
    }

    @Test
    void everyPageBelongsToARuleAndTheRegistryIsSorted() {
        List<String> names = Rules.all().stream().map(RuleInfo::name).toList();
        assertEquals(names.stream().sorted().toList(), names);
        List<String> pages = Arrays.stream(new File("src/main/resources/irreproof/rules").list())
                .map(file -> file.replace(".md", ""))
                .sorted()
                .toList();
        assertEquals(names, pages);
    }
}
