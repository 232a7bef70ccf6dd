package irreproof.architecture;

import irreproof.Tools;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** The files of the repository: tracked ones, and new ones that are not ignored. */
final class SourceTree {
    private static final Path ROOT = Path.of("").toAbsolutePath();

    private SourceTree() {}

    /** Paths relative to the top level, with {@code /} between folders, sorted. */
    static List<String> files() {
        try {
            Process git = new ProcessBuilder(
                            Tools.require("git").toString(), "ls-files", "--cached", "--others", "--exclude-standard")
                    .directory(ROOT.toFile())
                    .redirectError(ProcessBuilder.Redirect.INHERIT)
                    .start();
            List<String> paths = new String(git.getInputStream().readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(path -> Files.isRegularFile(ROOT.resolve(path)))
                    .distinct()
                    .sorted()
                    .toList();
            if (paths.isEmpty()) {
                throw new IllegalStateException("git lists no files in " + ROOT);
            }
            return paths;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The file's text; bytes that are not UTF-8 come out as replacement characters. */
    static String read(String path) {
        try {
            return new String(Files.readAllBytes(ROOT.resolve(path)), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
