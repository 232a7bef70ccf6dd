package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.Tools;
import irreproof.workspace.Version;
import java.io.IOException;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.TextDocumentSyncKind;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.Test;

/** From initialize to exit, in order and out of order. */
class LifeCycleTest {
    private static void assertRefused(ResponseErrorCode code, Editor editor, String method) {
        ResponseErrorException refusal = assertThrows(
                ResponseErrorException.class,
                () -> Editor.await(editor.endpoint().request(method, null)),
                method);
        assertEquals(code.getValue(), refusal.getResponseError().getCode(), refusal.getMessage());
    }

    @Test
    void theServerSaysWhatItCanDo() {
        try (Editor editor = Editor.fresh()) {
            InitializeResult result = editor.initialize("{}");
            assertEquals("irreproof", result.getServerInfo().getName());
            assertEquals(Version.text(), result.getServerInfo().getVersion());
            ServerCapabilities can = result.getCapabilities();
            assertEquals(
                    TextDocumentSyncKind.Incremental,
                    can.getTextDocumentSync().getRight().getChange());
            assertTrue(can.getTextDocumentSync().getRight().getOpenClose());
            assertTrue(can.getHoverProvider().getLeft());
        }
    }

    @Test
    void shutdownAndExitEndWithZero() {
        Editor editor = Editor.plain();
        editor.open("text");
        editor.leave();
    }

    @Test
    void exitWithoutShutdownEndsWithOne() {
        Editor editor = Editor.plain();
        editor.server().exit();
        assertEquals(1, editor.awaitExit());
    }

    @Test
    void exitWorksBeforeInitialize() {
        Editor editor = Editor.fresh();
        editor.server().exit();
        assertEquals(1, editor.awaitExit());
    }

    @Test
    void theEndOfTheInputEndsWithZero() throws IOException {
        Editor editor = Editor.plain();
        editor.raw().close();
        assertEquals(0, editor.awaitExit());
    }

    @Test
    void whatWasAskedBeforeTheEndOfTheInputIsAnswered() throws IOException {
        Editor editor = Editor.plain();
        editor.open("2 \\otimes 2 = 5");
        var hover = editor.askHover(0, 0);
        editor.raw().close();
        assertNotNull(Editor.await(hover));
        assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
        assertEquals(0, editor.awaitExit());
    }

    @Test
    void theServerEndsWhenTheEditorsProcessDoes() throws IOException {
        Process editorProcess = new ProcessBuilder(Tools.require("sleep").toString(), "600").start();
        Editor editor = Editor.with("{processId: " + editorProcess.pid() + "}");
        editor.hover(0, 0);
        editorProcess.destroy();
        assertEquals(0, editor.awaitExit());
    }

    @Test
    void aProcessThatCannotBeSeenIsNotWatched() {
        try (Editor editor = Editor.with("{processId: " + Integer.MAX_VALUE + "}")) {
            editor.open("2 \\otimes 2 = 5");
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
        }
    }

    @Test
    void requestsBeforeInitializeAreRefused() {
        try (Editor editor = Editor.fresh()) {
            editor.open("2 \\otimes 2 = 5");
            assertRefused(ResponseErrorCode.ServerNotInitialized, editor, "textDocument/hover");
            assertRefused(ResponseErrorCode.ServerNotInitialized, editor, "shutdown");
            editor.initialize("{}");
            assertEquals(0, editor.drainDiagnostics().size(), "a document opened too early is not known");
        }
    }

    @Test
    void requestsAfterShutdownAndASecondInitializeAreRefused() {
        Editor editor = Editor.plain();
        assertRefused(ResponseErrorCode.InvalidRequest, editor, "initialize");
        Editor.await(editor.server().shutdown());
        assertRefused(ResponseErrorCode.InvalidRequest, editor, "textDocument/hover");
        editor.server().exit();
        assertEquals(0, editor.awaitExit());
    }

    @Test
    void methodsThatNobodyServesAreRefusedOrDropped() {
        try (Editor editor = Editor.plain()) {
            // Editors were seen to ask these without their having been advertised.
            assertRefused(ResponseErrorCode.MethodNotFound, editor, "textDocument/documentSymbol");
            assertRefused(ResponseErrorCode.MethodNotFound, editor, "textDocument/documentHighlight");
            assertRefused(ResponseErrorCode.MethodNotFound, editor, "$/invented");
            assertRefused(ResponseErrorCode.MethodNotFound, editor, "textDocument/didOpen");
            assertRefused(ResponseErrorCode.InvalidParams, editor, "textDocument/hover");
            editor.endpoint().notify("workspace/didChangeWatchedFiles", null);
            editor.endpoint().notify("$/invented", null);
            editor.endpoint().notify("textDocument/hover", null);
            editor.hover(0, 0);
            assertEquals(0, editor.drainLog().size());
        }
    }
}
