package irreproof.workspace;

import irreproof.latex.SourceProvider;
import irreproof.text.SourceText;
import java.io.File;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * Finds what one document includes, as LaTeX does when run in the root document's folder: relative to that folder, and
 * otherwise (as many authors expect, and packages arrange) to the including file's. For a chapter it also finds the root
 * document, whose macros the chapter uses. Nothing outside the project's folder is read, whatever a name says.
 */
public final class ProjectSources implements SourceProvider {
    private static final Path CURRENT = Path.of("").toAbsolutePath();

    private final ProjectFolder project;
    private final Optional<Path> root;
    private final Path rootFolder;
    private final String document;

    /**
     * @param document the text to check; its path is a path on disk, absolute or relative to the current folder, or any
     *     name for a text that is in no file ({@code -}), which then belongs in the current folder
     */
    public ProjectSources(SourceText document, OpenDocuments open, FileCache cache) {
        Path file = absolute(document.path());
        this.document = document.path();
        this.project = new ProjectFolder(file.getParent(), open, cache);
        this.root = RootDocument.of(file, IncludeScan.of(document.content()), project);
        this.rootFolder = root.orElse(file).getParent();
    }

    @Override
    public Optional<SourceText> find(String from, String name) {
        return project.locate(rootFolder, name)
                .or(() -> project.locate(absolute(from).getParent(), name))
                .flatMap(this::text);
    }

    @Override
    public List<SourceText> preambles(String path) {
        return path.equals(document) ? root.flatMap(this::text).stream().toList() : List.of();
    }

    /** The text under a path like the document's: absolute, or relative to the current folder. */
    private Optional<SourceText> text(Path file) {
        Path shown = path(document).isAbsolute() ? file : CURRENT.relativize(file);
        return project.text(file, shown.toString().replace(File.separatorChar, '/'));
    }

    private static Path absolute(String name) {
        return CURRENT.resolve(path(name)).normalize();
    }

    private static Path path(String name) {
        try {
            return Path.of(name);
        } catch (InvalidPathException e) {
            return Path.of("unnamed");
        }
    }
}
