package irreproof.workspace;

import irreproof.text.SourceText;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * The part of the disk that may be read for a document, with the editor's unsaved texts laid over it: the nearest folder
 * above the document that marks a project; without a mark the folder above the document's own, so that a chapter in a
 * folder of its own still finds {@code ../macros}. Links that the author laid inside are followed.
 */
final class ProjectFolder {
    private static final List<String> MARKS = List.of(".git", "irreproof.toml");

    /** A folder with more LaTeX files is no manuscript; its further files are not looked at. */
    private static final int MOST_FILES = 300;

    private final Path top;
    private final OpenDocuments open;
    private final FileCache cache;

    /** @param folder the document's folder, absolute */
    ProjectFolder(Path folder, OpenDocuments open, FileCache cache) {
        this.top = top(folder);
        this.open = open;
        this.cache = cache;
    }

    private static Path top(Path documentFolder) {
        for (Path folder = documentFolder; folder != null; folder = folder.getParent()) {
            Path here = folder;
            if (MARKS.stream().anyMatch(mark -> Files.exists(here.resolve(mark)))) {
                return folder;
            }
        }
        return documentFolder.getParent() == null ? documentFolder : documentFolder.getParent();
    }

    boolean holds(Path folder) {
        return folder != null && folder.startsWith(top);
    }

    /**
     * The file a name leads to from a folder: with {@code .tex} added first, then as written, as TeX does.
     *
     * @return an absolute path
     */
    Optional<Path> locate(Path folder, String name) {
        try {
            for (String candidate : name.endsWith(".tex") ? List.of(name) : List.of(name + ".tex", name)) {
                Path file = folder.resolve(candidate).normalize();
                if (holds(file) && (open.find(file).isPresent() || Files.isRegularFile(file))) {
                    return Optional.of(file);
                }
            }
        } catch (InvalidPathException e) {
            // No file has such a name.
        }
        return Optional.empty();
    }

    /** Empty if it cannot be read or is too large. */
    Optional<SourceText> text(Path file, String shown) {
        return open.find(file).or(() -> cache.read(file, shown));
    }

    /** How a file is tied to others; as an unrelated one if it cannot be read. */
    IncludeScan scan(Path file) {
        return open.find(file)
                .map(text -> IncludeScan.of(text.content()))
                .or(() -> cache.scan(file))
                .orElse(new IncludeScan(false, List.of(), Optional.empty()));
    }

    /** The {@code .tex} files that lie in a folder itself, sorted. */
    List<Path> texFiles(Path folder) {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(file -> file.getFileName().toString().endsWith(".tex"))
                    .sorted()
                    .limit(MOST_FILES)
                    .toList();
        } catch (IOException | UncheckedIOException e) {
            return List.of();
        }
    }
}
