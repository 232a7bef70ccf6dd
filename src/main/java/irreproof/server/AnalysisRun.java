package irreproof.server;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
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
        CheckOptions options,
        long ticket,
        Budget budget,
        CompletableFuture<FileReport> report,
        AtomicBoolean begun) {

    AnalysisRun(Document document, CheckOptions options, long ticket) {
        this(document, options, ticket, Budget.unlimited(), new CompletableFuture<>(), new AtomicBoolean());
    }

    /** True for exactly one caller. */
    boolean begin() {
        return begun.compareAndSet(false, true);
    }

    void supersede() {
        // Cancelling the future alone would not stop the work.
        budget.cancel();
        report.cancel(false);
    }
}
