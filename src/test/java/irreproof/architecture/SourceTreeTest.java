package irreproof.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** What the repository may hold. */
class SourceTreeTest {
    private static final int LONGEST_FILE = 500;
    private static final Set<String> TOP_LEVEL =
            Set.of("README.md", "DEVELOPERS.md", "LICENSE", "pom.xml", "grammar", "src", "editor-clients");

    /** Words in brackets so that the pattern does not find itself: machine paths, registry hosts, notes on origins. */
    private static final Pattern UNWANTED =
            Pattern.compile("/(work|farm)[/]|[/]tmp/|registry[.]npmjs|repo[0-9]*[.]maven|deb[.]debian"
                    + "|(?i:[t]ranscript|the [l]ecture|the [s]peaker)");

    @Test
    void theTopLevelHoldsExactlyWhatIsListed() {
        Set<String> found = SourceTree.files().stream()
                .map(path -> path.split("/")[0])
                .filter(name -> !name.startsWith("."))
                .collect(Collectors.toCollection(TreeSet::new));
        found.removeAll(TOP_LEVEL);
        assertEquals(Set.of(), found);
    }

    @Test
    void noSourceFileIsTooLong() {
        List<String> found = new ArrayList<>();
        for (String path : SourceTree.files()) {
            if (path.matches("(src/(main|test)/java|grammar)/.*\\.(java|g4)")) {
                long lines = SourceTree.read(path).lines().count();
                if (lines > LONGEST_FILE) {
                    found.add(path + ": " + lines + " lines");
                }
            }
        }
        assertEquals(List.of(), found);
    }

    @Test
    void noFileTellsOfTheMachineItWasMadeOn() {
        List<String> found = new ArrayList<>();
        for (String path : SourceTree.files()) {
            SourceTree.read(path)
                    .lines()
                    .filter(line -> UNWANTED.matcher(line).find())
                    .forEach(line -> found.add(path + ": " + line.strip()));
        }
        assertEquals(List.of(), found);
    }
}
