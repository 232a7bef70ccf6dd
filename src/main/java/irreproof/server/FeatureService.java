package irreproof.server;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import irreproof.check.FileReport;
import irreproof.server.transport.EditorClient;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.function.BiFunction;
import java.util.function.Supplier;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionParams;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.jsonrpc.services.JsonRequest;

/** Answers requests; each from the report on the newest version, by a record built for the one request. */
final class FeatureService {
    private final Analyses analyses;
    private final EditorClient client;
    private final Supplier<Session> session;

    FeatureService(Analyses analyses, EditorClient client, Supplier<Session> session) {
        this.analyses = analyses;
        this.client = client;
        this.session = session;
    }

    @JsonRequest("textDocument/hover")
    public CompletableFuture<Hover> hover(HoverParams request) {
        return fromReport(
                request.getTextDocument().getUri(),
                null,
                (document, report) ->
                        new Hovering(document, report, session.get().client()).at(request.getPosition()));
    }

    @JsonRequest("textDocument/codeAction")
    public CompletableFuture<List<Either<Command, CodeAction>>> codeAction(CodeActionParams request) {
        return fromReport(
                request.getTextDocument().getUri(),
                List.of(),
                (document, report) ->
                        new QuickFixes(document, report, session.get().client()).at(request));
    }

    /** Sends the edit of a quick fix back to the client; its answer is nothing to wait for. */
    @JsonRequest("workspace/executeCommand")
    public CompletableFuture<Object> executeCommand(ExecuteCommandParams request) {
        List<Object> arguments = request.getArguments();
        if (QuickFixes.APPLY_COMMAND.equals(request.getCommand())
                && arguments != null
                && arguments.size() == 2
                && arguments.get(0) instanceof JsonElement title
                && arguments.get(1) instanceof JsonElement edit) {
            JsonObject parameters = new JsonObject();
            parameters.add("label", title);
            parameters.add("edit", edit);
            client.applyEdit(parameters);
        }
        return CompletableFuture.completedFuture(null);
    }

    /**
     * The answer to a request, or that for an empty document if a newer version overtakes it. Cancelling the request
     * gives up the answer but not the analysis, whose diagnostics are still wanted.
     */
    private <R> CompletableFuture<R> fromReport(String uri, R nothing, BiFunction<Document, FileReport, R> feature) {
        return analyses.current(uri)
                .map(run -> run.report()
                        .handle((report, failure) -> report == null ? nothing : feature.apply(run.document(), report)))
                .orElseGet(() -> CompletableFuture.completedFuture(nothing));
    }
}
