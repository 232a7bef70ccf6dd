package irreproof.latex;

import irreproof.text.SourceText;
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

    static SourceProvider none() {
        return (from, name) -> Optional.empty();
    }
}
