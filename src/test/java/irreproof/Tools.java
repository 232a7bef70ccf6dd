package irreproof;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Assumptions;

/**
 * Outside programs that some tests run as an oracle or a client. Where one is absent its tests are skipped, but with
 * {@code IRREPROOF_REQUIRE_TOOLS=1} in the environment (as on the build machine) they fail, so that a skip cannot pass
 * for a success.
 */
public final class Tools {
    private Tools() {}

    /** The program's full path, found on {@code PATH}; otherwise the calling test ends here, skipped or failed. */
    public static Path require(String program) {
        for (String folder : System.getenv().getOrDefault("PATH", "").split(File.pathSeparator)) {
            Path candidate = Path.of(folder, program);
            if (!folder.isEmpty() && Files.isExecutable(candidate) && !Files.isDirectory(candidate)) {
                return candidate;
            }
        }
        if ("1".equals(System.getenv("IRREPROOF_REQUIRE_TOOLS"))) {
            Assertions.fail(program + " is not on the path, and IRREPROOF_REQUIRE_TOOLS asks for it");
        }
        Assumptions.abort(program + " is not on the path");
        throw new AssertionError("unreachable");
    }
}
