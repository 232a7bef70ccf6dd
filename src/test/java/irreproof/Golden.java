package irreproof;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Golden files under src/test/resources. {@code mvn test -Dgolden=write} writes them anew; look at the difference before
 * you commit it.
 */
public final class Golden {
    private static final Path ROOT = Path.of("src", "test", "resources");

    private Golden() {}

    public static void assertMatches(String name, String actual) {
        Path file = ROOT.resolve(name);
        try {
            if ("write".equals(System.getProperty("golden"))) {
                Files.createDirectories(file.getParent());
                Files.writeString(file, actual);
            }
            assertEquals(Files.readString(file), actual, "golden file " + name);
        } catch (IOException failure) {
            throw new AssertionError("no golden file " + name + "; write it with -Dgolden=write", failure);
        }
    }
}
