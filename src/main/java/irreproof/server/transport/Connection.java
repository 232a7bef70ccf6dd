package irreproof.server.transport;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.InputStream;
import java.io.OutputStream;
import java.time.Duration;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletionException;
import java.util.function.Function;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.jsonrpc.JsonRpcException;
import org.eclipse.lsp4j.jsonrpc.RemoteEndpoint;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.json.JsonRpcMethod;
import org.eclipse.lsp4j.jsonrpc.json.MessageJsonHandler;
import org.eclipse.lsp4j.jsonrpc.json.StreamMessageConsumer;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.jsonrpc.services.ServiceEndpoints;

/**
 * One conversation with one client over a pair of streams: reader, dispatcher and outbox wired together. lsp4j's own
 * launcher is not used because it parses a message's body right from the stream (see {@link MessageReader}), writes on
 * the thread that speaks (see {@link Outbox}), and tells standard error what the client should know.
 */
public final class Connection {
    /** Held here because the logging system keeps its loggers only weakly. */
    private static final Logger LIBRARY_LOG = Logger.getLogger("org.eclipse.lsp4j");

    private final Outbox outbox;
    private final RemoteEndpoint remote;
    private final MessageReader reader;
    private final EditorClient client;

    /** @param services makes the objects whose annotated methods serve the client that is given to it */
    public Connection(InputStream in, OutputStream out, Function<EditorClient, List<Object>> services) {
        // Either ordinary (a cancellation that comes too late) or told to the client by report.
        LIBRARY_LOG.setLevel(Level.OFF);
        Map<String, JsonRpcMethod> methods =
                new LinkedHashMap<>(ServiceEndpoints.getSupportedMethods(EditorClient.class));
        MessageJsonHandler json = new MessageJsonHandler(methods);
        Dispatcher dispatcher = new Dispatcher(this::report);
        outbox = new Outbox(new StreamMessageConsumer(new BufferedOutputStream(out), json));
        remote = new RemoteEndpoint(outbox, dispatcher, this::answer);
        remote.setJsonHandler(json);
        json.setMethodProvider(remote);
        reader = new MessageReader(new BufferedInputStream(in), json, remote, this::report);
        client = ServiceEndpoints.toServiceObject(remote, EditorClient.class);
        methods.putAll(dispatcher.serve(services.apply(client)));
    }

    /** Handles messages on the calling thread until the client closes its end or {@link #stopListening} is called. */
    public void listen() {
        try {
            reader.listen(remote);
        } catch (JsonRpcException e) {
            // The stream broke; for the server that is its end.
        }
    }

    /** Makes {@link #listen} return after the message it is handling; to be called from there. */
    public void stopListening() {
        reader.close();
    }

    /** Writes what is still to be written, within the time limit. */
    public void close(Duration limit) {
        outbox.close(limit);
    }

    /** Tells the client in one message what went wrong here. */
    private void report(Throwable problem) {
        client.logMessage(new MessageParams(MessageType.Error, Failures.describe(problem)));
    }

    private ResponseError answer(Throwable problem) {
        Throwable cause =
                problem instanceof CompletionException && problem.getCause() != null ? problem.getCause() : problem;
        if (cause instanceof ResponseErrorException refusal) {
            return refusal.getResponseError();
        }
        report(cause);
        return new ResponseError(ResponseErrorCode.InternalError, Failures.describe(cause), null);
    }
}
