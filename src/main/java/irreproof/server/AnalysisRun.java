package irreproof.server;

import irreproof.budget.Budget;
import irreproof.check.FileReport;
import irreproof.workspace.RememberedSources;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * One analysis of one version of a document: waiting, at work, done or superseded.
 *
 * @param ticket from the gate, for its results
 * @param report completed with the report, or exceptionally if superseded or crashed; the features wait for it
 */
record AnalysisRun(
        Document document,
        RememberedSources sources,
        long ticket,
        Budget budget,
        CompletableFuture<FileReport> report,
        AtomicBoolean begun) {

    AnalysisRun(Document document, RememberedSources sources, long ticket) {
        this(document, sources, ticket, Budget.unlimited(), new CompletableFuture<>(), new AtomicBoolean());
    }

    /** True for exactly one caller. */
    boolean begin() {
        return begun.compareAndSet(false, true);
    }

    /** Whether the report could be another if that document had another text: if it took it, or still may. */
    boolean dependsOn(Document other) {
        return !report.isDone() || sources.took(other.source().path());
    }

    void supersede() {
        // Cancelling the future alone would not stop the work.
        budget.cancel();
        report.cancel(false);
    }
}
