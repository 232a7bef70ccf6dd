package irreproof.server;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The documents that the client has open. Only the dispatch thread may touch it; others get the documents themselves. */
final class DocumentTable {
    private final Map<String, Document> documents = new LinkedHashMap<>();
    private Thread owner;

    void put(Document document) {
        own();
        documents.put(document.uri(), document);
    }

    Optional<Document> find(String uri) {
        own();
        return Optional.ofNullable(documents.get(uri));
    }

    Optional<Document> remove(String uri) {
        own();
        return Optional.ofNullable(documents.remove(uri));
    }

    List<Document> all() {
        own();
        return new ArrayList<>(documents.values());
    }

    private void own() {
        if (owner == null) {
            owner = Thread.currentThread();
        } else if (owner != Thread.currentThread()) {
            throw new IllegalStateException("the document table belongs to " + owner.getName());
        }
    }
}
