package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.Tools;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A real Neovim with the set-up that is shipped, the built launcher and the demo manuscript. */
class NeovimIT {
    private static final Path LAUNCHER = Path.of(System.getProperty("irreproof.launcher"));
    private static final Path DEMO = Path.of("src", "demo");
    private static final long SECONDS = 300;

    /** A sextet where its conjugate belongs. */
    private static final String WRONG_LINE = "  \\rep{8}\\tensor\\rep{3} = \\rep{15}\\dsum\\rep{6}\\dsum\\rep{3} .";

    private static final String FIXED_LINE = "  \\rep{8}\\tensor\\rep{3} = \\rep{15}\\dsum\\repbar{6}\\dsum\\rep{3} .";

    @TempDir
    private Path folder;

    @Test
    void opensTheDemoHoversAndAppliesAQuickFix() throws IOException, InterruptedException {
        Path neovim = Tools.require("nvim");
        copyDemo();
        Path paper = folder.resolve("lantern.tex");
        int line = Files.readAllLines(paper).indexOf(WRONG_LINE);
        assertTrue(line >= 0, "the demo has changed");
        Path result = folder.resolve("result");
        Map<String, String> environment = Map.of(
                "EDITOR_CLIENTS",
                Path.of("editor-clients").toAbsolutePath().toString(),
                "TEX",
                paper.toString(),
                "RULE",
                "congruence-mismatch",
                "LINE",
                String.valueOf(line),
                "HOVER_AT",
                line + ":" + (WRONG_LINE.indexOf("{8}") + 1),
                "HOVER_SHOWS",
                "dimension: 8",
                "FIXED_LINE",
                FIXED_LINE,
                "RESULT",
                result.toString());
        String output = run(neovim, environment);
        assertTrue(Files.exists(result), output);
        assertEquals(
                List.of(
                        "ok   the finding is shown",
                        "ok   hover shows dimension: 8",
                        "ok   the quick fix mends the line",
                        "ok   the finding goes",
                        "ok   no finding comes",
                        "ok   there is one server",
                        "ok   the server exits with 0"),
                Files.readAllLines(result),
                output);
    }

    private void copyDemo() throws IOException {
        try (Stream<Path> files = Files.list(DEMO)) {
            for (Path file : files.toList()) {
                Files.copy(file, folder.resolve(file.getFileName()));
            }
        }
    }

    /** Runs the session in an editor without any set-up of its user's; returns what it prints. */
    private String run(Path neovim, Map<String, String> environment) throws IOException, InterruptedException {
        Path session = Path.of("src", "test", "neovim", "session.lua").toAbsolutePath();
        Path printed = folder.resolve("printed");
        ProcessBuilder builder = new ProcessBuilder(
                        neovim.toString(), "--headless", "-u", "NONE", "-i", "NONE", "-n", "-c", "luafile " + session)
                .directory(folder.toFile())
                .redirectErrorStream(true)
                .redirectOutput(printed.toFile());
        Map<String, String> all = builder.environment();
        all.put("PATH", LAUNCHER.getParent() + ":" + all.get("PATH"));
        for (String home : List.of("HOME", "XDG_CONFIG_HOME", "XDG_DATA_HOME", "XDG_CACHE_HOME", "XDG_STATE_HOME")) {
            all.put(home, folder.resolve("home").toString());
        }
        all.putAll(environment);
        Process process = builder.start();
        try {
            assertTrue(process.waitFor(SECONDS, TimeUnit.SECONDS), "the editor hangs");
        } finally {
            process.descendants().forEach(ProcessHandle::destroy);
            process.destroy();
        }
        return Files.readString(printed);
    }
}
