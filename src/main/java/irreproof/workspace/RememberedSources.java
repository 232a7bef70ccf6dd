package irreproof.workspace;

import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;

/**
 * The sources of one document, which remember what a reading took from them, so that an editor knows what to check
 * again when a text changes. No file is looked at before the reading asks. One instance serves one reading; what it
 * remembers may be asked from any thread.
 */
public final class RememberedSources implements SourceProvider {
    private final Supplier<SourceProvider> opening;
    private final Set<String> taken = ConcurrentHashMap.newKeySet();
    private volatile boolean lacking;
    private SourceProvider sources;

    private RememberedSources(Supplier<SourceProvider> opening) {
        this.opening = opening;
    }

    /** What {@link ProjectSources} finds for the document. */
    public static RememberedSources of(SourceText document, OpenDocuments open, FileCache cache) {
        return new RememberedSources(() -> new ProjectSources(document, open, cache));
    }

    /** For a text that lies in no folder and so includes nothing. */
    public static RememberedSources none() {
        return new RememberedSources(SourceProvider::none);
    }

    @Override
    public Optional<SourceText> find(String from, String name) {
        return remember(sources().find(from, name).stream().toList()).stream().findFirst();
    }

    @Override
    public List<SourceText> preambles(String path) {
        return remember(sources().preambles(path));
    }

    /** True if the text of this path was taken. */
    public boolean took(String path) {
        return taken.contains(path);
    }

    /** True if something that was asked for was not there. */
    public boolean isLacking() {
        return lacking;
    }

    private List<SourceText> remember(List<SourceText> found) {
        found.forEach(text -> taken.add(text.path()));
        lacking |= found.isEmpty();
        return found;
    }

    private synchronized SourceProvider sources() {
        if (sources == null) {
            sources = opening.get();
        }
        return sources;
    }
}
