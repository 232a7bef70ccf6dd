package irreproof.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The code map of DEVELOPERS.md and the packages are the same list. */
class CodeMapTest {
    private static final Pattern HEADING = Pattern.compile("(?m)^### `([a-z.]+)`");

    @Test
    void everyPackageHasItsParagraph() {
        Set<String> packages = SourceTree.files().stream()
                .filter(path -> path.startsWith("src/main/java/irreproof/") && path.endsWith(".java"))
                .map(path -> path.substring("src/main/java/irreproof/".length(), path.lastIndexOf('/'))
                        .replace('/', '.'))
                .collect(Collectors.toCollection(TreeSet::new));
        Set<String> described = HEADING.matcher(SourceTree.read("DEVELOPERS.md"))
                .results()
                .map(heading -> heading.group(1))
                .collect(Collectors.toCollection(TreeSet::new));
        assertEquals(packages, described);
    }

    @Test
    void everyParagraphStatesAnInvariant() {
        String[] sections = SourceTree.read("DEVELOPERS.md").split("(?m)^#+ ");
        Set<String> without = new TreeSet<>();
        for (String section : sections) {
            if (section.startsWith("`")
                    && !Pattern.compile("(?m)^Invariant: ").matcher(section).find()) {
                without.add(section.lines().findFirst().orElseThrow());
            }
        }
        assertEquals(Set.of(), without);
    }
}
