package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.WorkspaceEdit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The initialize requests of real editors, recorded as they came in, each followed by a short session. */
class RecordedClientsTest {
    private static final Path FOLDER = Path.of("src/test/resources/clients");

    static List<Path> recordings() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.filter(file -> file.toString().endsWith(".json"))
                    .sorted()
                    .toList();
        }
    }

    @Test
    void thereAreRecordings() throws IOException {
        assertTrue(recordings().size() >= 18, recordings().toString());
    }

    @ParameterizedTest
    @MethodSource("recordings")
    void theClientIsServedInItsOwnTerms(Path recording) throws IOException {
        JsonObject parameters = JsonParser.parseString(Files.readString(recording))
                .getAsJsonObject()
                .getAsJsonObject("params");
        JsonObject capabilities = parameters.getAsJsonObject("capabilities");
        PrintStream standardError = System.err;
        ByteArrayOutputStream errors = new ByteArrayOutputStream();
        System.setErr(new PrintStream(errors, true, StandardCharsets.UTF_8));
        try (Editor editor = Editor.fresh()) {
            ServerCapabilities answer = editor.initialize(parameters.toString()).getCapabilities();
            JsonArray offers = array(capabilities, "general", "positionEncodings");
            assertEquals(offers.isEmpty() ? null : offers.get(0).getAsString(), answer.getPositionEncoding());
            assertTrue(answer.getHoverProvider().getLeft());
            assertEquals(
                    List.of("quickfix"),
                    answer.getCodeActionProvider().getRight().getCodeActionKinds());

            editor.open("2 \\otimes 2 = 5");
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            assertEquals(1, published.getDiagnostics().size());
            boolean markdown = array(capabilities, "textDocument", "hover", "contentFormat")
                    .toString()
                    .contains("markdown");
            assertEquals(markdown ? "**2'**\n\n- dimension: 2" : "2'\n\ndimension: 2", editor.hover(0, 0));
            CodeAction action = editor.codeActions(
                            published.getDiagnostics().get(0).getRange(),
                            new CodeActionContext(published.getDiagnostics()))
                    .get(0)
                    .getRight();
            WorkspaceEdit edit = action.getEdit();
            boolean versioned = is(capabilities, "workspace", "workspaceEdit", "documentChanges");
            assertEquals(versioned, edit.getDocumentChanges() != null);
            assertEquals(!versioned, !edit.getChanges().isEmpty());
            assertEquals(
                    is(capabilities, "textDocument", "codeAction", "isPreferredSupport") ? Boolean.TRUE : null,
                    action.getIsPreferred());
            editor.leave();
        } finally {
            System.setErr(standardError);
        }
        assertEquals("", errors.toString(StandardCharsets.UTF_8));
    }

    private static boolean is(JsonObject object, String... path) {
        JsonObject parent = parent(object, path);
        String last = path[path.length - 1];
        return parent.has(last) && parent.get(last).getAsBoolean();
    }

    private static JsonArray array(JsonObject object, String... path) {
        JsonObject parent = parent(object, path);
        String last = path[path.length - 1];
        return parent.has(last) ? parent.getAsJsonArray(last) : new JsonArray();
    }

    private static JsonObject parent(JsonObject object, String... path) {
        JsonObject parent = object;
        for (int i = 0; i < path.length - 1; i++) {
            parent = parent.has(path[i]) ? parent.getAsJsonObject(path[i]) : new JsonObject();
        }
        return parent;
    }
}
