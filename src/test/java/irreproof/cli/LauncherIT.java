package irreproof.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonParser;
import irreproof.Golden;
import irreproof.Tools;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The built program as a process of its own, through its launcher. */
class LauncherIT {
    private static final Path LAUNCHER = Path.of(System.getProperty("irreproof.launcher"));

    @TempDir
    private Path folder;

    /** Links out of the folder are taken away first: emptying it would warn of each. */
    @AfterEach
    void deleteLinks() throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path link : files.filter(Files::isSymbolicLink).toList()) {
                Files.delete(link);
            }
        }
    }

    private record Run(int code, String out, String err) {}

    @Test
    void runsFromAnyFolder() throws Exception {
        Files.writeString(folder.resolve("paper.tex"), "Nothing to check.");
        assertEquals(new Run(0, "1 file, 0 statements\n", ""), run(Map.of(), LAUNCHER, "check", "paper.tex"));
        assertEquals(new Run(0, "1 file, 0 statements\n", ""), run(Map.of(), LAUNCHER, "check", "."));
    }

    @Test
    void runsThroughLinksAndInFoldersWithBlanks() throws Exception {
        Path there = Files.createDirectory(folder.resolve("a b"));
        Path first = Files.createSymbolicLink(there.resolve("first"), LAUNCHER);
        Path second = Files.createSymbolicLink(there.resolve("second link"), Path.of("first"));
        assertEquals(run(Map.of(), LAUNCHER, "--version"), run(Map.of(), first, "--version"));
        assertEquals(run(Map.of(), LAUNCHER, "--version"), run(Map.of(), second, "--version"));
    }

    /** README's first command: the demo's planted mistakes and nothing else, word for word. */
    @Test
    void reportsTheDemo() throws Exception {
        Run run = run(
                Map.of(),
                LAUNCHER,
                "check",
                Path.of("src/demo").toAbsolutePath().toString());
        assertEquals("", run.err());
        Golden.assertMatches("demo/report.txt", run.out().replace(Path.of("").toAbsolutePath() + "/", ""));
        assertEquals(1, run.code());
    }

    /** A pipe, unlike a file put in place of standard input, has no position to ask for. */
    @Test
    void readsStandardInputFromAPipe() throws Exception {
        Process process = start(Map.of(), LAUNCHER, "check", "-").start();
        process.getOutputStream().write("In $SU(3)$, $3\\otimes3=6\\oplus3$.\n".getBytes(StandardCharsets.UTF_8));
        process.getOutputStream().close();
        Run run = finish(process);
        assertEquals(1, run.code());
        assertTrue(run.out().startsWith("-:1:"), run.out() + run.err());
    }

    @Test
    void derivesAndExplainsRules() throws Exception {
        assertEquals(
                new Run(0, "3\\otimes\\bar 3 = 8\\oplus1\n", ""),
                run(Map.of(), LAUNCHER, "derive", "3\\otimes\\bar 3", "--group", "SU(3)"));
        assertEquals(2, run(Map.of(), LAUNCHER, "derive", "3\\otimes 3").code());
        assertEquals(
                new Run(0, "27 \\to 26\\oplus1\n", ""), run(Map.of(), LAUNCHER, "derive", "27", "--group", "E6 -> F4"));
        Run page = run(Map.of(), LAUNCHER, "rules", "dimension-mismatch");
        assertTrue(page.out().startsWith("# dimension-mismatch\n"), page.out());
    }

    @Test
    void readsStandardInputAndPrintsJson() throws Exception {
        Files.writeString(folder.resolve("input"), "Nothing to check.");
        Process process = start(Map.of(), LAUNCHER, "check", "--format", "json", "-")
                .redirectInput(folder.resolve("input").toFile())
                .start();
        Run run = finish(process);
        assertEquals(0, run.code());
        assertEquals("", run.err());
        assertEquals(
                "{\"statements\":0,\"holds\":0,\"fails\":0,\"undecided\":0}",
                JsonParser.parseString(run.out())
                        .getAsJsonObject()
                        .get("summary")
                        .toString());
    }

    /** The session that also warms the class-data archive: a client opens a document, asks twice, and closes its end. */
    @Test
    void servesOnStandardInputAndOutput() throws Exception {
        Process process = start(Map.of(), LAUNCHER, "serve", "--stdio")
                .redirectInput(Path.of("src/build/warm-up/session.lsp").toFile())
                .start();
        Run run = finish(process);
        assertEquals(0, run.code());
        assertEquals("", run.err());
        assertTrue(run.out().startsWith("Content-Length: "), run.out());
        assertTrue(run.out().contains("\"method\":\"textDocument/publishDiagnostics\""), run.out());
    }

    @Test
    void wrongUsageExitsWith2() throws Exception {
        Run run = run(Map.of(), LAUNCHER, "check", "missing.tex");
        assertEquals(new Run(2, "", "irreproof: there is no file or folder missing.tex\n"), run);
    }

    @Test
    void looksForJavaInTheGivenOrder() throws Exception {
        Path own = fakeJava("own");
        Path usual = fakeJava("usual");
        Path onPath = fakeJava("path").resolve("bin");
        String nowhere = folder.resolve("nowhere").toString();
        String tools = System.getenv("PATH");
        assertEquals(
                "own\n",
                run(Map.of("IRREPROOF_JAVA_HOME", own.toString(), "JAVA_HOME", usual.toString()), LAUNCHER)
                        .out());
        assertEquals(
                "usual\n",
                run(Map.of("IRREPROOF_JAVA_HOME", nowhere, "JAVA_HOME", usual.toString()), LAUNCHER)
                        .out());
        assertEquals(
                "path\n",
                run(Map.of("JAVA_HOME", nowhere, "PATH", onPath + ":" + tools), LAUNCHER)
                        .out());
    }

    @Test
    void withoutJavaItSaysSoAndExitsWith127() throws Exception {
        Run run = run(Map.of("PATH", commandsButJava().toString(), "JAVA_HOME", ""), LAUNCHER, "check", "-");
        assertEquals(127, run.code());
        assertEquals("", run.out());
        assertEquals("irreproof: no Java found: install Java 17 or newer, or set JAVA_HOME\n", run.err());
    }

    @Test
    void anOlderJavaIsNamedAndExitsWith127() throws Exception {
        Path old = fakeJava("old");
        for (String version : List.of("1.8.0_412", "11.0.22", "16")) {
            Files.writeString(old.resolve("release"), "IMPLEMENTOR=\"X\"\nJAVA_VERSION=\"" + version + "\"\n");
            Run run = run(Map.of("IRREPROOF_JAVA_HOME", old.toString()), LAUNCHER, "check", "-");
            String java = old.resolve("bin/java").toString();
            String message = "irreproof: Java 17 or newer is needed, but " + java + " is Java " + version + "\n";
            assertEquals(new Run(127, "", message), run);
        }
        for (String version : List.of("17", "17.0.15", "21-ea", "25.0.3")) {
            Files.writeString(old.resolve("release"), "JAVA_VERSION=\"" + version + "\"\n");
            assertEquals(
                    "old\n",
                    run(Map.of("IRREPROOF_JAVA_HOME", old.toString()), LAUNCHER).out());
        }
    }

    @Test
    void anArchiveThatDoesNotFitIsIgnoredWithoutAWord() throws Exception {
        Path copy = folder.resolve("copy");
        for (String name : List.of("bin/irreproof", "lib/irreproof.jar", "lib/irreproof.jsa")) {
            Path from = LAUNCHER.getParent().getParent().resolve(name);
            assertTrue(Files.exists(from), name + " was not built");
            Files.createDirectories(copy.resolve(name).getParent());
            Files.copy(from, copy.resolve(name));
        }
        Path launcher = copy.resolve("bin/irreproof");
        assertTrue(launcher.toFile().setExecutable(true));
        Run expected = run(Map.of(), LAUNCHER, "--version");
        assertEquals(expected, run(Map.of(), launcher, "--version"));
        Files.writeString(copy.resolve("lib/irreproof.jsa"), "no archive");
        assertEquals(expected, run(Map.of(), launcher, "--version"));
        Files.delete(copy.resolve("lib/irreproof.jsa"));
        assertEquals(expected, run(Map.of(), launcher, "--version"));
    }

    /** A Java home whose {@code java} prints the given word. */
    private Path fakeJava(String word) throws IOException {
        Path java = folder.resolve(word).resolve("bin").resolve("java");
        Files.createDirectories(java.getParent());
        Files.writeString(java, "#!/bin/sh\necho " + word + "\n");
        assertTrue(java.toFile().setExecutable(true));
        return folder.resolve(word);
    }

    /** A folder with the commands that the launcher itself needs, to serve as a path without Java. */
    private Path commandsButJava() throws IOException {
        Path commands = Files.createDirectory(folder.resolve("commands"));
        for (String name : List.of("sh", "readlink", "dirname")) {
            Files.createSymbolicLink(commands.resolve(name), Tools.require(name));
        }
        return commands;
    }

    private Run run(Map<String, String> environment, Path program, String... arguments) throws Exception {
        return finish(start(environment, program, arguments).start());
    }

    private ProcessBuilder start(Map<String, String> environment, Path program, String... arguments) {
        ProcessBuilder builder = new ProcessBuilder(program.toString()).directory(folder.toFile());
        builder.command().addAll(List.of(arguments));
        builder.environment().remove("IRREPROOF_JAVA_HOME");
        builder.environment().putAll(environment);
        return builder;
    }

    private static Run finish(Process process) throws Exception {
        process.getOutputStream().close();
        // Both are short: neither pipe can fill up while the other is read.
        String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        String err = new String(process.getErrorStream().readAllBytes(), StandardCharsets.UTF_8);
        return new Run(process.waitFor(), out, err);
    }
}
