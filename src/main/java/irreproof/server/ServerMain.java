package irreproof.server;

import irreproof.check.Checker;
import irreproof.server.transport.Connection;
import irreproof.server.transport.EditorClient;
import java.io.InputStream;
import java.io.OutputStream;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.atomic.AtomicReference;

/** Entry to the language server. */
public final class ServerMain {
    private static final Duration PAUSE_IN_TYPING = Duration.ofMillis(100);
    private static final Duration LAST_WORDS = Duration.ofSeconds(2);

    private ServerMain() {}

    /**
     * Serves until the client says exit, closes its end, or dies (if initialize told its process). Nothing is left to
     * be done afterwards: some clients kill the process right after exit. All threads are daemons; one may still be
     * blocked in reading when this returns.
     *
     * @param in the client's messages, and nothing else
     * @param out for the server's messages, and nothing else
     * @return the process exit code: 0, but 1 for an exit without a shutdown before it
     */
    public static int run(InputStream in, OutputStream out) {
        return run(in, out, Checker::check, PAUSE_IN_TYPING);
    }

    static int run(InputStream in, OutputStream out, Analysis analysis, Duration pause) {
        Workers workers = new Workers();
        CompletableFuture<Integer> exitCode = new CompletableFuture<>();
        Connection connection = new Connection(in, out, client -> services(client, analysis, workers, pause, exitCode));
        Workers.named("irreproof-dispatch")
                .newThread(() -> {
                    try {
                        connection.listen();
                        // Messages may have been piped in from a file: answer them all.
                        workers.finish(LAST_WORDS);
                        exitCode.complete(0);
                    } finally {
                        exitCode.complete(1);
                    }
                })
                .start();
        exitCode.thenRun(connection::stopListening);
        int code = exitCode.join();
        workers.stop();
        connection.close(LAST_WORDS);
        return code;
    }

    private static List<Object> services(
            EditorClient client,
            Analysis analysis,
            Workers workers,
            Duration pause,
            CompletableFuture<Integer> exitCode) {
        AtomicReference<Session> session = new AtomicReference<>();
        PublishGate gate = new PublishGate(client);
        Analyses analyses = new Analyses(analysis, workers, gate, client, pause, session::get);
        return List.of(
                new LifeCycle(client, session::set, exitCode::complete),
                new DocumentService(new DocumentTable(), new Project(), analyses, gate, client, session::get),
                new FeatureService(analyses, client, session::get));
    }
}
