package irreproof.workspace;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;

/**
 * Finds the document a file belongs to: the one it names; or else, nearest folder first, a document of its own in the
 * file's folder or one above that includes it, directly or through other files.
 */
final class RootDocument {
    private static final int MOST_INCLUDED = 500;

    private final ProjectFolder project;

    private RootDocument(ProjectFolder project) {
        this.project = project;
    }

    /**
     * @param file absolute and normalised; it need not exist on disk
     * @return absolute; empty if the file is a document of its own, or none includes it
     */
    static Optional<Path> of(Path file, IncludeScan scan, ProjectFolder project) {
        Path folder = file.getParent();
        if (scan.root().isPresent()) {
            return project.locate(folder, scan.root().get()).filter(root -> !root.equals(file));
        }
        if (scan.ownDocument()) {
            return Optional.empty();
        }
        return new RootDocument(project).includer(file);
    }

    private Optional<Path> includer(Path file) {
        for (Path folder = file.getParent(); project.holds(folder); folder = folder.getParent()) {
            for (Path candidate : project.texFiles(folder)) {
                if (project.scan(candidate).ownDocument() && includes(candidate, file)) {
                    return Optional.of(candidate);
                }
            }
        }
        return Optional.empty();
    }

    private boolean includes(Path document, Path file) {
        Set<Path> seen = new HashSet<>(Set.of(document));
        Deque<Path> waiting = new ArrayDeque<>(seen);
        while (!waiting.isEmpty() && seen.size() < MOST_INCLUDED) {
            Path including = waiting.remove();
            for (String name : project.scan(including).included()) {
                Optional<Path> included = project.locate(document.getParent(), name)
                        .or(() -> project.locate(including.getParent(), name));
                if (included.isPresent() && included.get().equals(file)) {
                    return true;
                }
                included.filter(seen::add).ifPresent(waiting::add);
            }
        }
        return false;
    }
}
