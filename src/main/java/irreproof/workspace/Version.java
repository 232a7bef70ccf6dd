package irreproof.workspace;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The program's version, which the build writes into a resource. */
public final class Version {
    private Version() {}

    public static String text() {
        try (InputStream stream = Version.class.getResourceAsStream("/irreproof/version.txt")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
