package irreproof.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import irreproof.check.Rules;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CommandLineProgramTest {
    @TempDir
    private Path folder;

    /** What one run of the program did. */
    private record Run(int code, String out, String err) {}

    @Test
    void everyCommandExplainsItself() {
        for (String command : List.of("check", "derive", "rules", "serve")) {
            Run help = run("", command, "--help");
            assertEquals(0, help.code());
            assertTrue(help.out().startsWith("Usage: irreproof " + command + " "), help.out());
            assertEquals("", help.err());
            assertTrue(run("", "--help").out().contains("\n  " + command + " "));
        }
    }

    @Test
    void printsItsVersion() {
        Run version = run("", "--version");
        assertEquals(0, version.code());
        assertTrue(version.out().matches("irreproof [0-9]+\\.[0-9]+\\.[0-9]+\n"), version.out());
    }

    @Test
    void saysInPlainWordsWhatIsWrongWithTheCommandLine() {
        assertUsage("no command given", "irreproof");
        assertUsage("Unmatched argument at index 0: 'chekc'", "irreproof", "chekc");
        assertUsage("Missing required parameter: 'PATH'", "irreproof check", "check");
        assertUsage("Unknown option: '--nonsense'", "irreproof check", "check", "--nonsense", "a");
        assertUsage("Missing required parameter: 'LATEX'", "irreproof derive", "derive");
    }

    @Test
    void derivesInTheNotationAskedFor() {
        String latex = "(\\mathbf{3},\\mathbf{2})_{1/6}\\otimes(\\bar{\\mathbf 3},\\mathbf 1)_{1/3}";
        String group = "SU(3) x SU(2) x U(1)";
        assertEquals(
                new Run(0, latex + " = (\\mathbf{8},\\mathbf{2})_{1/2}\\oplus(\\mathbf{1},\\mathbf{2})_{1/2}\n", ""),
                run("", "derive", latex, "--group", group));
        assertEquals(
                new Run(0, latex + " = ((1,1),(1))_{1/2}\\oplus((0,0),(1))_{1/2}\n", ""),
                run("", "derive", latex, "--group", group, "--notation", "dynkin"));
        assertFailure("--notation is dimension, dynkin or young, not roman", "derive", "3", "--notation", "roman");
        assertFailure(
                "irreps of SO(10) are not named by Young diagrams here",
                "derive",
                "10\\otimes10",
                "--group",
                "SO(10)",
                "--notation",
                "young");
        assertFailure("no embedding of E6 in SU(3) is known here", "derive", "\\mathbf{8}", "--group", "SU(3) -> E6");
    }

    @Test
    void saysWhatCannotBeDone() {
        assertFailure("--format is text or json, not xml", "check", "--format", "xml", "-");
        assertFailure("there is no rule nonsense; `irreproof rules` lists them", "rules", "nonsense");
        Path missing = folder.resolve("missing.tex");
        assertFailure("there is no file or folder " + missing, "check", missing.toString());
        Path target = folder.resolve("no/such/folder/report.json");
        assertFailure("the report could not be written to " + target, "check", "-", "--output", target.toString());
    }

    @Test
    void aReportThatCannotBeWrittenIsNoCleanReport() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        OutputStream full = new OutputStream() {
            @Override
            public void write(int one) throws IOException {
                throw new IOException("no space left");
            }
        };
        Console console = new Console(new ByteArrayInputStream(new byte[0]), full, printer(err));
        assertEquals(2, CommandLineProgram.run(new String[] {"check", "-"}, console));
        assertEquals("irreproof: standard output cannot be written to\n", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aCrashAsksForAReportInOneLine() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Console noInput = new Console(null, new ByteArrayOutputStream(), printer(err));
        assertEquals(2, CommandLineProgram.run(new String[] {"check", "-"}, noInput));
        String message = err.toString(StandardCharsets.UTF_8);
        assertTrue(
                message.startsWith("irreproof: this is a fault of the program, please report it: java.lang.Null"),
                message);
        assertEquals(1, message.lines().count());
    }

    @Test
    void checksStandardInput() {
        Run text = run("Nothing to check.", "check", "-");
        assertEquals(new Run(0, "1 file, 0 statements\n", ""), text);
        assertEquals(
                List.of("-"),
                paths(run("Nothing to check.", "check", "--format", "json", "-").out()));
    }

    @Test
    void filesComeInTheOrderOfTheirPaths() throws IOException {
        List<String> expected = new ArrayList<>();
        for (int i = 10; i < 50; i++) {
            Path file = folder.resolve("part" + i + ".tex");
            Files.writeString(file, "Nothing to check. ".repeat(i % 7 * 500));
            expected.add(file.toString());
        }
        assertEquals(
                expected,
                paths(run("", "check", "--format", "json", folder.toString()).out()));
    }

    @Test
    void writesTheReportIntoAFile() throws IOException {
        Path report = folder.resolve("report.txt");
        assertEquals(new Run(0, "", ""), run("", "check", "-", "--output", report.toString()));
        assertEquals("1 file, 0 statements\n", Files.readString(report));
    }

    @Test
    void listsEveryRuleAndPrintsItsPage() {
        List<String> listed =
                run("", "rules").out().lines().map(line -> line.split(" ")[0]).toList();
        assertEquals(Rules.all().stream().map(rule -> rule.name()).toList(), listed);
        Rules.all()
                .forEach(rule ->
                        assertEquals(new Run(0, rule.page().strip() + "\n", ""), run("", "rules", rule.name())));
    }

    private static void assertUsage(String message, String command, String... arguments) {
        String err = "irreproof: " + message + "\n`" + command + " --help` tells how to use it\n";
        assertEquals(new Run(2, "", err), run("", arguments));
    }

    private static void assertFailure(String message, String... arguments) {
        assertEquals(new Run(2, "", "irreproof: " + message + "\n"), run("", arguments));
    }

    private static List<String> paths(String json) {
        List<String> paths = new ArrayList<>();
        JsonObject report = JsonParser.parseString(json).getAsJsonObject();
        for (JsonElement file : report.getAsJsonArray("files")) {
            paths.add(file.getAsJsonObject().get("path").getAsString());
        }
        return paths;
    }

    private static Run run(String input, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = CommandLineProgram.run(
                arguments,
                new Console(new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)), out, printer(err)));
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    private static PrintStream printer(OutputStream stream) {
        return new PrintStream(stream, true, StandardCharsets.UTF_8);
    }
}
