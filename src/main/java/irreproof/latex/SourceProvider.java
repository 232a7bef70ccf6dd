package irreproof.latex;

import irreproof.text.SourceText;
import java.util.List;
import java.util.Optional;

/** Finds the files that a document includes. The workspace layer implements it; nothing in this layer touches files. */
@FunctionalInterface
public interface SourceProvider {
    /**
     * @param from the path of the file that includes
     * @param name the name as written ({@code macros}, {@code chapters/one.tex}, {@code mystyle.sty})
     * @return the file, or empty if it is not part of the project
     */
    Optional<SourceText> find(String from, String name);

    /**
     * The files whose definitions a document may use without including them: for a chapter, the document that includes
     * it. Empty for a document of its own.
     *
     * @param path the path of the document that is read
     */
    default List<SourceText> preambles(String path) {
        return List.of();
    }

    static SourceProvider none() {
        return (from, name) -> Optional.empty();
    }
}
