package irreproof.workspace;

import irreproof.text.SourceText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.FileTime;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * Texts of files on disk, kept as long as size and time of change stay the same; the least recently used go first. For
 * included files, which many documents share and an editor asks for at every key stroke. Safe for many threads.
 */
public final class FileCache {
    private static final int MOST_FILES = 256;

    private final Map<Path, Entry> entries = new LinkedHashMap<>(16, 0.75f, true) {
        private static final long serialVersionUID = 1;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Path, Entry> eldest) {
            return size() > MOST_FILES;
        }
    };

    private record Entry(long size, FileTime changed, SourceText text, IncludeScan scan) {}

    /** Empty if there is no such regular file, or it cannot be read or is too large. */
    Optional<SourceText> read(Path file, String shown) {
        return entry(file).map(Entry::text).map(text -> new SourceText(shown, text.content(), text.lines()));
    }

    Optional<IncludeScan> scan(Path file) {
        return entry(file).map(Entry::scan);
    }

    private synchronized Optional<Entry> entry(Path file) {
        try {
            BasicFileAttributes now = Files.readAttributes(file, BasicFileAttributes.class);
            if (!now.isRegularFile()) {
                return Optional.empty();
            }
            Entry known = entries.get(file);
            if (known == null || known.size != now.size() || !known.changed.equals(now.lastModifiedTime())) {
                SourceText text = FileReading.read(file, file.toString());
                known = new Entry(now.size(), now.lastModifiedTime(), text, IncludeScan.of(text.content()));
                entries.put(file, known);
            }
            return Optional.of(known);
        } catch (IOException | UnreadableFile e) {
            return Optional.empty();
        }
    }
}
