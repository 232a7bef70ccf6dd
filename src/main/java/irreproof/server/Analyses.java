package irreproof.server;

import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
import irreproof.server.transport.EditorClient;
import irreproof.server.transport.Failures;
import irreproof.workspace.RememberedSources;
import java.time.Duration;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Predicate;
import java.util.function.Supplier;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;

/**
 * Keeps one analysis per open document, that of its newest version. Called by the dispatch thread only; the work itself
 * runs on the workers and hands its results to the gate.
 */
final class Analyses {
    private static final int MOST_COMPLAINTS = 100;

    private final Analysis analysis;
    private final Workers workers;
    private final PublishGate gate;
    private final EditorClient client;
    private final Duration pause;
    private final Supplier<Session> session;
    private final Map<String, AnalysisRun> runs = new HashMap<>();
    private final Set<String> complaints = ConcurrentHashMap.newKeySet();

    /** @param pause how long the typing must rest before a changed document is analysed */
    Analyses(
            Analysis analysis,
            Workers workers,
            PublishGate gate,
            EditorClient client,
            Duration pause,
            Supplier<Session> session) {
        this.analysis = analysis;
        this.workers = workers;
        this.gate = gate;
        this.client = client;
        this.pause = pause;
        this.session = session;
    }

    /** Analyses a document right now. */
    void start(Document document, RememberedSources sources) {
        AnalysisRun run = replace(document, sources);
        workers.run(() -> begin(run));
    }

    /** Analyses a document when its author pauses, or as soon as a feature asks. */
    void startSoon(Document document, RememberedSources sources) {
        AnalysisRun run = replace(document, sources);
        workers.runAfter(pause, () -> begin(run));
    }

    /** The other documents whose analysis must be done again when this one has another text. */
    List<Document> dependents(Document changed) {
        return dependents(changed, run -> run.dependsOn(changed));
    }

    /** The same when this one has come or gone: it may now be found, or be another file than before. */
    List<Document> dependentsOnPresence(Document changed) {
        return dependents(
                changed, run -> run.dependsOn(changed) || run.sources().isLacking());
    }

    private List<Document> dependents(Document changed, Predicate<AnalysisRun> depends) {
        return runs.values().stream()
                .filter(run -> !run.document().uri().equals(changed.uri()))
                .filter(depends)
                .map(AnalysisRun::document)
                .toList();
    }

    /** The analysis of the newest version, begun at once if it still waited for a pause. */
    Optional<AnalysisRun> current(String uri) {
        Optional<AnalysisRun> run = Optional.ofNullable(runs.get(uri));
        run.filter(waiting -> !waiting.begun().get()).ifPresent(waiting -> workers.run(() -> begin(waiting)));
        return run;
    }

    void forget(String uri) {
        Optional.ofNullable(runs.remove(uri)).ifPresent(AnalysisRun::supersede);
    }

    private AnalysisRun replace(Document document, RememberedSources sources) {
        AnalysisRun run = new AnalysisRun(document, sources, gate.admit(document.uri()));
        Optional.ofNullable(runs.put(document.uri(), run)).ifPresent(AnalysisRun::supersede);
        return run;
    }

    private void begin(AnalysisRun run) {
        if (run.budget().isCancelled() || !run.begin()) {
            return;
        }
        try {
            CheckOptions options =
                    new CheckOptions(session.get().settings().group(), run.sources(), CheckOptions.DEFAULT_STEPS, true);
            FileReport report = analysis.check(run.document().source(), options, run.budget());
            List<Diagnostic> diagnostics =
                    new Diagnostics(run.document(), report, session.get().client()).list();
            if (!run.budget().isCancelled() && gate.publish(run.document(), run.ticket(), diagnostics)) {
                run.report().complete(report);
            }
        } catch (Throwable e) {
            if (!run.budget().isCancelled() && gate.publish(run.document(), run.ticket(), List.of())) {
                complain(run.document(), e);
                run.report().completeExceptionally(e);
            }
        }
    }

    /** Once for each kind of failure, lest a failure at every keystroke fill the log. */
    private void complain(Document document, Throwable failure) {
        String description = Failures.describe(failure);
        if (complaints.size() < MOST_COMPLAINTS && complaints.add(description)) {
            client.logMessage(new MessageParams(
                    MessageType.Error,
                    document.source().path() + " could not be checked; please report this: " + description));
        }
    }
}
