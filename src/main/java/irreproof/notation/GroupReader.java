package irreproof.notation;

import irreproof.latex.PlainText;
import java.util.List;
import java.util.Optional;

/** Finds group names in flattened text. */
public final class GroupReader {
    private GroupReader() {}

    /** All group names in the text, in order; the longest product counts as one. */
    public static List<GroupName> find(PlainText text) {
        throw new UnsupportedOperationException("in the making");
    }

    /** Reads a text that consists of one group name, as typed after {@code --group} or in a directive. */
    public static Optional<GroupName> read(PlainText text) {
        throw new UnsupportedOperationException("in the making");
    }
}
