package irreproof.workspace;

import irreproof.text.SourceText;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** The texts an editor holds, saved or not, by file: an immutable snapshot. They win over the files on disk. */
public final class OpenDocuments {
    private static final OpenDocuments NONE = new OpenDocuments(Map.of());

    private final Map<Path, SourceText> texts;

    private OpenDocuments(Map<Path, SourceText> texts) {
        this.texts = texts;
    }

    public static OpenDocuments none() {
        return NONE;
    }

    public OpenDocuments with(Path file, SourceText text) {
        Map<Path, SourceText> changed = new HashMap<>(texts);
        changed.put(key(file), text);
        return new OpenDocuments(Map.copyOf(changed));
    }

    public OpenDocuments without(Path file) {
        Map<Path, SourceText> changed = new HashMap<>(texts);
        changed.remove(key(file));
        return new OpenDocuments(Map.copyOf(changed));
    }

    public Optional<SourceText> find(Path file) {
        return Optional.ofNullable(texts.get(key(file)));
    }

    private static Path key(Path file) {
        return file.toAbsolutePath().normalize();
    }
}
