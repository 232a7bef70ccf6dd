package irreproof.server;

import irreproof.server.transport.EditorClient;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.PublishDiagnosticsParams;

/**
 * The only way for diagnostics to leave the server; safe for all threads. It lets through the results of a document's
 * newest analysis only, sorted, with the version they belong to, and an empty list when a document closes.
 *
 * <p>What would change nothing in the editor is held back: the same list for the same version, and an empty list after
 * an empty one. An equal list for a newer version does go out, because editors shift their marks while the text changes.
 */
final class PublishGate {
    private static final Comparator<Position> BY_POSITION =
            Comparator.comparingInt(Position::getLine).thenComparingInt(Position::getCharacter);
    private static final Comparator<Diagnostic> ORDER = Comparator.comparing(
                    (Diagnostic diagnostic) -> diagnostic.getRange().getStart(), BY_POSITION)
            .thenComparing(diagnostic -> diagnostic.getRange().getEnd(), BY_POSITION)
            .thenComparing(Diagnostic::getSeverity)
            .thenComparing(diagnostic -> diagnostic.getCode().getLeft())
            .thenComparing(diagnostic -> diagnostic.getMessage().getLeft());

    private final EditorClient client;
    private final Map<String, Entry> entries = new HashMap<>();
    private long lastTicket;

    PublishGate(EditorClient client) {
        this.client = client;
    }

    /** What is known of one open document. */
    private static final class Entry {
        private long ticket;
        private PublishDiagnosticsParams last;
    }

    /** Begins an analysis of a document and thereby shuts out all earlier ones; the ticket goes with its results. */
    synchronized long admit(String uri) {
        Entry entry = entries.computeIfAbsent(uri, key -> new Entry());
        entry.ticket = ++lastTicket;
        return entry.ticket;
    }

    /** @return false if the results came too late and were dropped */
    synchronized boolean publish(Document document, long ticket, List<Diagnostic> diagnostics) {
        Entry entry = entries.get(document.uri());
        if (entry == null || entry.ticket != ticket) {
            return false;
        }
        List<Diagnostic> sorted = diagnostics.stream().sorted(ORDER).toList();
        PublishDiagnosticsParams message = new PublishDiagnosticsParams(document.uri(), sorted, document.version());
        boolean empty = sorted.isEmpty()
                && entry.last != null
                && entry.last.getDiagnostics().isEmpty();
        if (!message.equals(entry.last) && !empty) {
            client.publishDiagnostics(message);
        }
        entry.last = message;
        return true;
    }

    synchronized void close(Document document) {
        entries.remove(document.uri());
        client.publishDiagnostics(new PublishDiagnosticsParams(document.uri(), List.of(), document.version()));
    }
}
