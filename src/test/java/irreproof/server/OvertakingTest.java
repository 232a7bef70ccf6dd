package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
import irreproof.server.transport.EditorClient;
import irreproof.text.SourceText;
import java.io.IOException;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.Semaphore;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

/** Edits and requests that come while an analysis is at work. */
@Timeout(120)
class OvertakingTest {
    private static final String SLOW = "slow 1 \\otimes 1 = 2";
    private static final String QUICK = "quick 2 \\otimes 2 = 5, 3 \\otimes 3 = 5";

    /** Works on slow texts until it is cancelled. */
    private static final class Endless {
        final CountDownLatch begun = new CountDownLatch(1);
        final CompletableFuture<BudgetExceeded.Cause> end = new CompletableFuture<>();

        FileReport check(SourceText source, CheckOptions options, Budget budget) {
            if (source.content().startsWith("slow")) {
                begun.countDown();
                try {
                    while (true) {
                        budget.spend(1000);
                    }
                } catch (BudgetExceeded e) {
                    end.complete(e.reason());
                    throw e;
                }
            }
            return DimensionSums.check(source, options, budget);
        }
    }

    @Test
    void anEditCancelsTheAnalysisOfTheOlderVersion() throws InterruptedException {
        Endless endless = new Endless();
        try (Editor editor = new Editor(endless::check, Duration.ZERO)) {
            editor.initialize("{}");
            editor.open(SLOW);
            endless.begun.await();
            editor.change(2, new TextDocumentContentChangeEvent(QUICK));
            assertEquals(BudgetExceeded.Cause.CANCELLED, Editor.await(endless.end));
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            assertEquals(2, published.getVersion());
            assertEquals(2, published.getDiagnostics().size());
            assertEquals(List.of(), editor.drainLog());
        }
    }

    @Test
    void closingCancelsToo() throws InterruptedException {
        Endless endless = new Endless();
        try (Editor editor = new Editor(endless::check, Duration.ZERO)) {
            editor.initialize("{}");
            editor.open(SLOW);
            endless.begun.await();
            editor.close(Editor.URI);
            assertEquals(BudgetExceeded.Cause.CANCELLED, Editor.await(endless.end));
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics());
        }
    }

    @Test
    void aStaleResultIsNeverPublished() throws InterruptedException {
        Semaphore begun = new Semaphore(0);
        Semaphore mayEnd = new Semaphore(0);
        // This one does not listen to its budget and comes back late.
        Analysis deaf = (source, options, budget) -> {
            if (source.content().startsWith("slow")) {
                begun.release();
                mayEnd.acquireUninterruptibly();
            }
            return DimensionSums.check(source, options, Budget.unlimited());
        };
        try (Editor editor = new Editor(deaf, Duration.ZERO)) {
            editor.initialize("{}");
            editor.open(SLOW);
            begun.acquire();
            editor.change(2, new TextDocumentContentChangeEvent(QUICK));
            assertEquals(2, editor.nextDiagnostics().getVersion());
            mayEnd.release();
            // When both workers are busy again, the late result is through.
            editor.change(3, new TextDocumentContentChangeEvent("slow, first"));
            begun.acquire();
            editor.open("file:///ws/other.tex", 1, "slow, second");
            begun.acquire();
            mayEnd.release(Integer.MAX_VALUE / 2);
            PublishDiagnosticsParams first = editor.nextDiagnostics();
            PublishDiagnosticsParams second = editor.nextDiagnostics();
            assertEquals(3, first.getUri().equals(Editor.URI) ? first.getVersion() : second.getVersion());
            assertEquals(List.of(), first.getDiagnostics());
            assertEquals(List.of(), second.getDiagnostics());
        }
    }

    @Test
    void theGateRefusesOldTickets() {
        List<PublishDiagnosticsParams> sent = new ArrayList<>();
        PublishGate gate = new PublishGate(new SilentClient(sent));
        Document document = Document.of(Editor.URI, 1, SLOW);
        long old = gate.admit(document.uri());
        long current = gate.admit(document.uri());
        assertFalse(gate.publish(document, old, List.of()));
        assertEquals(List.of(), sent);
        assertTrue(gate.publish(document, current, List.of()));
        assertEquals(1, sent.size());
        gate.close(document);
        assertFalse(gate.publish(document, current, List.of()), "closed");
        assertEquals(2, sent.size());
    }

    /** Keeps what is published. */
    private record SilentClient(List<PublishDiagnosticsParams> sent) implements EditorClient {
        @Override
        public void publishDiagnostics(PublishDiagnosticsParams diagnostics) {
            sent.add(diagnostics);
        }

        @Override
        public void logMessage(MessageParams message) {
            throw new AssertionError(message);
        }

        @Override
        public CompletableFuture<Object> applyEdit(JsonObject parameters) {
            throw new AssertionError(parameters);
        }
    }

    @Test
    void requestsAreAnsweredWhileAnAnalysisIsAtWork() throws InterruptedException {
        Endless endless = new Endless();
        try (Editor editor = new Editor(endless::check, Duration.ZERO)) {
            editor.initialize("{}");
            editor.open(SLOW);
            endless.begun.await();
            CompletableFuture<Hover> waiting = editor.askHover(0, 6);
            assertThrows(
                    ResponseErrorException.class,
                    () -> Editor.await(editor.endpoint().request("invented", null)));
            assertFalse(waiting.isDone());
            editor.change(2, new TextDocumentContentChangeEvent(QUICK));
            assertNull(Editor.await(waiting), "what it was asked about is gone");
            assertEquals("2'\n\ndimension: 2", editor.hover(0, 6));
        }
    }

    @Test
    void aCancelledRequestIsAnsweredAtOnceAndTheAnalysisGoesOn() throws Exception {
        Semaphore begun = new Semaphore(0);
        Semaphore mayEnd = new Semaphore(0);
        RawClient client = new RawClient(
                (source, options, budget) -> {
                    begun.release();
                    mayEnd.acquireUninterruptibly();
                    return DimensionSums.check(source, options, budget);
                },
                1 << 16);
        client.send("'id': 1, 'method': 'initialize', 'params': {}");
        client.send("'method': 'textDocument/didOpen', 'params': {'textDocument':"
                + " {'uri': 'u', 'languageId': 'tex', 'version': 1, 'text': '1 \\\\otimes 1 = 2'}}");
        begun.acquire();
        client.send("'id': 2, 'method': 'textDocument/hover', 'params': {'textDocument': {'uri': 'u'},"
                + " 'position': {'line': 0, 'character': 0}}");
        client.send("'method': '$/cancelRequest', 'params': {'id': 2}");
        JsonObject answer = client.receiveAnswer(2);
        assertEquals(
                ResponseErrorCode.RequestCancelled.getValue(),
                answer.getAsJsonObject("error").get("code").getAsInt());
        mayEnd.release();
        JsonObject published = client.receive();
        assertEquals("textDocument/publishDiagnostics", published.get("method").getAsString());
        assertEquals(
                1,
                published
                        .getAsJsonObject("params")
                        .getAsJsonArray("diagnostics")
                        .size());
        assertEquals(0, client.leave());
    }

    @Test
    void aFeatureDoesNotWaitForAPauseInTheTyping() {
        try (Editor editor = new Editor(DimensionSums::check, Duration.ofHours(1))) {
            editor.initialize("{}");
            editor.open("clean");
            editor.nextDiagnostics();
            editor.change(2, new TextDocumentContentChangeEvent(QUICK));
            assertEquals("2'\n\ndimension: 2", editor.hover(0, 6));
            assertEquals(2, editor.nextDiagnostics().getVersion());
            editor.leave();
        }
    }

    @Test
    void aCrashIsToldOnceAndTheServerLives() {
        Analysis fragile = (source, options, budget) -> {
            if (source.content().startsWith("slow")) {
                throw new IllegalStateException("a defect");
            }
            if (source.content().startsWith("deep")) {
                return deep(source, 1);
            }
            return DimensionSums.check(source, options, budget);
        };
        try (Editor editor = new Editor(fragile, Duration.ZERO)) {
            editor.initialize("{}");
            editor.open(SLOW);
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics());
            assertTrue(editor.nextLog().getMessage().contains("IllegalStateException: a defect"));
            editor.change(2, new TextDocumentContentChangeEvent(SLOW + " "));
            assertNull(editor.hover(0, 6));
            assertEquals(List.of(), editor.drainLog(), "not again");
            editor.change(3, new TextDocumentContentChangeEvent("deep"));
            assertTrue(editor.nextLog().getMessage().contains("StackOverflowError"));
            editor.change(4, new TextDocumentContentChangeEvent(QUICK));
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            assertEquals(4, published.getVersion());
            assertEquals(2, published.getDiagnostics().size());
        }
    }

    private static FileReport deep(SourceText source, int depth) {
        return depth < 0 ? new FileReport(source, List.of(), List.of()) : deep(source, depth + 1);
    }

    @Test
    void theServerNeverWaitsForTheClientToRead() throws IOException {
        // Both pipes together hold far less than the answers, and nobody reads until everything is asked.
        RawClient client = new RawClient(DimensionSums::check, 1 << 10);
        client.send("'id': 0, 'method': 'initialize', 'params': {}");
        int requests = 500;
        for (int id = 1; id <= requests; id++) {
            client.send("'id': " + id + ", 'method': 'invented'");
        }
        assertTrue(client.receive().has("result"));
        for (int id = 1; id <= requests; id++) {
            assertEquals(id, client.receive().get("id").getAsInt());
        }
        assertEquals(0, client.leave());
    }
}
