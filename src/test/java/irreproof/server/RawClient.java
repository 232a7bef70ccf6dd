package irreproof.server;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.io.InputStream;
import java.io.PipedInputStream;
import java.io.PipedOutputStream;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.concurrent.CompletableFuture;

/** A client without a library: sees every message as it is on the wire, and reads only when asked to. */
final class RawClient {
    private final PipedOutputStream toServer;
    private final InputStream fromServer;
    private final CompletableFuture<Integer> exitCode = new CompletableFuture<>();

    /** @param capacity how many bytes each of the two pipes holds */
    RawClient(Analysis analysis, int capacity) throws IOException {
        PipedInputStream serverIn = new PipedInputStream(capacity);
        PipedInputStream clientIn = new PipedInputStream(capacity);
        PipedOutputStream serverOut = new PipedOutputStream(clientIn);
        toServer = new PipedOutputStream(serverIn);
        fromServer = clientIn;
        Thread thread =
                new Thread(() -> exitCode.complete(ServerMain.run(serverIn, serverOut, analysis, Duration.ZERO)));
        thread.setDaemon(true);
        thread.start();
    }

    /** @param members of the message beside the protocol's own, with single quotes for double ones */
    void send(String members) throws IOException {
        byte[] body = ("{\"jsonrpc\": \"2.0\", " + members.replace('\'', '"') + "}").getBytes(StandardCharsets.UTF_8);
        toServer.write(("Content-Length: " + body.length + "\r\n\r\n").getBytes(StandardCharsets.US_ASCII));
        toServer.write(body);
        toServer.flush();
    }

    JsonObject receive() throws IOException {
        StringBuilder head = new StringBuilder();
        while (head.indexOf("\r\n\r\n") < 0) {
            head.append((char) fromServer.read());
        }
        int length = Integer.parseInt(head.toString().strip().replaceFirst("(?i)content-length: *", ""));
        return JsonParser.parseString(new String(fromServer.readNBytes(length), StandardCharsets.UTF_8))
                .getAsJsonObject();
    }

    /** The answer to a request; what comes before it is passed over. */
    JsonObject receiveAnswer(int id) throws IOException {
        JsonObject message = receive();
        while (!message.has("id") || message.get("id").getAsInt() != id) {
            message = receive();
        }
        return message;
    }

    int leave() throws IOException {
        send("'id': -1, 'method': 'shutdown'");
        receiveAnswer(-1);
        send("'method': 'exit'");
        return Editor.await(exitCode);
    }
}
