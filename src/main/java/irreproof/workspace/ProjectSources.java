package irreproof.workspace;

import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * Finds what a document includes, as LaTeX would when run in the root document's folder: {@code \input{name}} relative
 * to that folder, and also (as many authors expect, and packages arrange) relative to the including file; with
 * {@code .tex} added first, then as written. Nothing outside the project folder is read, whatever a name says; links
 * that the author laid inside it are followed.
 */
public final class ProjectSources implements SourceProvider {
    private static final List<String> PROJECT_MARKS = List.of(".git", "irreproof.toml");

    private final Path rootFolder;
    private final Path projectFolder;
    private final OpenDocuments open;
    private final FileCache cache;

    /** @param rootFolder the folder LaTeX would run in, as a rule that of the document to check */
    public ProjectSources(Path rootFolder, OpenDocuments open, FileCache cache) {
        this.rootFolder = rootFolder.toAbsolutePath().normalize();
        this.projectFolder = projectFolder(this.rootFolder);
        this.open = open;
        this.cache = cache;
    }

    /**
     * The nearest folder above that marks a project; without a mark the folder above the given one, so that a chapter
     * in a folder of its own still finds {@code ../macros}.
     */
    static Path projectFolder(Path rootFolder) {
        for (Path folder = rootFolder; folder != null; folder = folder.getParent()) {
            Path here = folder;
            if (PROJECT_MARKS.stream().anyMatch(mark -> Files.exists(here.resolve(mark)))) {
                return folder;
            }
        }
        return rootFolder.getParent() == null ? rootFolder : rootFolder.getParent();
    }

    @Override
    public Optional<SourceText> find(String from, String name) {
        try {
            Path including = Path.of(from).getParent();
            Path fromFolder = including == null ? Path.of("") : including;
            for (String candidate : name.endsWith(".tex") ? List.of(name) : List.of(name + ".tex", name)) {
                Optional<SourceText> found = text(rootFolder.resolve(candidate));
                if (found.isEmpty()) {
                    found = text(fromFolder.resolve(candidate));
                }
                if (found.isPresent()) {
                    return found;
                }
            }
            return Optional.empty();
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }

    private Optional<SourceText> text(Path candidate) {
        Path file = candidate.toAbsolutePath().normalize();
        if (!file.startsWith(projectFolder)) {
            return Optional.empty();
        }
        return open.find(file)
                .or(() -> cache.read(file, candidate.normalize().toString().replace(File.separatorChar, '/')));
    }
}
