package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.SequenceInputStream;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.Collections;
import java.util.List;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever comes in, the server goes on serving, and tells the client's log what was wrong. */
class MalformedInputTest {
    private static byte[] framed(String body) {
        byte[] bytes = body.getBytes(StandardCharsets.UTF_8);
        return concat(("Content-Length: " + bytes.length + "\r\n\r\n").getBytes(StandardCharsets.US_ASCII), bytes);
    }

    private static byte[] concat(byte[] first, byte[] second) {
        ByteArrayOutputStream result = new ByteArrayOutputStream();
        result.writeBytes(first);
        result.writeBytes(second);
        return result.toByteArray();
    }

    private static void assertSurvives(byte[] bytes) throws IOException {
        try (Editor editor = Editor.plain()) {
            OutputStream raw = editor.raw();
            raw.write(bytes);
            raw.flush();
            editor.open("2 \\otimes 2 = 5");
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
            assertTrue(editor.nextLog().getMessage().length() < 1000);
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "no header at all\r\n\r\n",
                "Content-Length: many\r\n\r\n",
                "Content-Length: -5\r\n\r\n",
                "Content-Length: 2\r\nContent-Type: text; charset=nonsense\r\n\r\n{}",
            })
    void brokenHeads(String head) throws IOException {
        assertSurvives(head.getBytes(StandardCharsets.US_ASCII));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "null",
                "3",
                "[]",
                "{}",
                "not json, and\n\nContent-Length: 3\n\nfull of line ends",
                "{\"jsonrpc\": \"2.0\", \"id\": 5, \"method\": ",
                "{\"jsonrpc\": \"2.0\", \"id\": 5, \"method\": \"shutdown\"} trailing",
                "{\"jsonrpc\": \"2.0\", \"id\": {}, \"method\": \"shutdown\"}",
                "{\"jsonrpc\": \"2.0\", \"id\": 99999999999999, \"method\": \"shutdown\"}",
                "[{\"jsonrpc\": \"2.0\", \"id\": 5, \"method\": \"shutdown\"}]",
                "{\"jsonrpc\": \"2.0\", \"method\": \"textDocument/didOpen\", \"params\": 7}",
                "{\"jsonrpc\": \"2.0\", \"method\": \"textDocument/didOpen\", \"params\": {}}",
                "{\"jsonrpc\": \"2.0\", \"method\": \"textDocument/didOpen\"}",
                "{\"jsonrpc\": \"2.0\", \"method\": \"textDocument/didOpen\", \"params\": {\"textDocument\": {\"uri\": 3}}}",
                "{\"jsonrpc\": \"2.0\", \"method\": \"textDocument/didChange\", \"params\": {\"textDocument\": {\"uri\": \"file:///other\", \"version\": 3}, \"contentChanges\": []}}",
                "{\"jsonrpc\": \"2.0\", \"id\": 5, \"method\": \"textDocument/hover\", \"params\": {\"textDocument\": 5}}",
            })
    void brokenBodies(String body) throws IOException {
        assertSurvives(framed(body));
    }

    @Test
    void invalidUtf8() throws IOException {
        assertSurvives(concat(
                "Content-Length: 3\r\n\r\n".getBytes(StandardCharsets.US_ASCII),
                new byte[] {'{', (byte) 0xC3, (byte) 0x28}));
    }

    @Test
    void deepNesting() throws IOException {
        String deep = "[".repeat(200_000);
        assertSurvives(framed("{\"jsonrpc\": \"2.0\", \"id\": 5, \"method\": \"x\", \"params\": " + deep));
    }

    @Test
    void aBodyBeyondAllBoundsIsSkipped() {
        int size = (1 << 27) + 1;
        byte[] initialize = framed("{\"jsonrpc\": \"2.0\", \"id\": 1, \"method\": \"initialize\", \"params\": {}}");
        InputStream in = new SequenceInputStream(Collections.enumeration(List.of(
                new ByteArrayInputStream(("Content-Length: " + size + "\r\n\r\n").getBytes(StandardCharsets.US_ASCII)),
                new Zeros(size),
                new ByteArrayInputStream(initialize))));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        assertEquals(0, ServerMain.run(in, out, DimensionSums::check, Duration.ZERO));
        String written = out.toString(StandardCharsets.UTF_8);
        assertTrue(written.contains("a message of " + size + " bytes was skipped"), written);
        assertTrue(written.contains("hoverProvider"), written);
    }

    /** So many bytes, all of them zero. */
    private static final class Zeros extends InputStream {
        private int left;

        Zeros(int count) {
            left = count;
        }

        @Override
        public int read() {
            return left-- > 0 ? 0 : -1;
        }

        @Override
        public int read(byte[] bytes, int from, int length) {
            int count = Math.min(left, length);
            left -= count;
            return count > 0 ? count : -1;
        }
    }

    @Test
    void aTruncatedBodyIsTheEnd() throws IOException {
        Editor editor = Editor.plain();
        editor.raw().write("Content-Length: 50\r\n\r\n{".getBytes(StandardCharsets.US_ASCII));
        editor.raw().close();
        assertEquals(0, editor.awaitExit());
    }

    @Test
    void headerNamesInAnyCase() throws IOException {
        try (Editor editor = Editor.plain()) {
            editor.raw()
                    .write("content-length: 37\r\n\r\n{\"jsonrpc\": \"2.0\", \"method\": \"exit\"} "
                            .getBytes(StandardCharsets.US_ASCII));
            editor.raw().flush();
            assertEquals(1, editor.awaitExit());
        }
    }

    @Test
    void aRequestWithoutWhatItNeedsIsAnsweredWithAnError() {
        try (Editor editor = Editor.plain()) {
            editor.open("2 \\otimes 2 = 5");
            JsonObject parameters = new JsonObject();
            JsonObject document = new JsonObject();
            document.addProperty("uri", Editor.URI);
            parameters.add("textDocument", document);
            ResponseErrorException refusal = assertThrows(
                    ResponseErrorException.class,
                    () -> Editor.await(editor.endpoint().request("textDocument/hover", parameters)));
            assertEquals(
                    ResponseErrorCode.InternalError.getValue(),
                    refusal.getResponseError().getCode());
        }
    }

    @Test
    void changesThatLieOutsideTheText() {
        try (Editor editor = Editor.plain()) {
            editor.open("2 \\otimes 2 = ");
            editor.nextDiagnostics();
            editor.change(
                    2, new TextDocumentContentChangeEvent(new Range(new Position(5, 5), new Position(9, 9)), "5"));
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
        }
    }
}
