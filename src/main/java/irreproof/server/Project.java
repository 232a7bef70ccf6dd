package irreproof.server;

import irreproof.workspace.FileCache;
import irreproof.workspace.OpenDocuments;
import irreproof.workspace.RememberedSources;

/**
 * Where the files come from that a document includes: the open documents as they stand, saved or not, else the disk.
 * Only the dispatch thread may touch it; the sources it gives out are snapshots.
 */
final class Project {
    private final FileCache cache = new FileCache();
    private OpenDocuments open = OpenDocuments.none();

    void put(Document document) {
        document.file().ifPresent(file -> open = open.with(file, document.source()));
    }

    void remove(Document document) {
        document.file().ifPresent(file -> open = open.without(file));
    }

    /** No file is looked at before the reading asks, so that the dispatch thread waits for no disk. */
    RememberedSources sources(Document document) {
        return document.file().isPresent()
                ? RememberedSources.of(document.source(), open, cache)
                : RememberedSources.none();
    }
}
