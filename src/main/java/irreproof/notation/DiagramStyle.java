package irreproof.notation;

import java.util.List;
import java.util.stream.Collectors;

/** How Young diagrams are written: what stands around the row lengths, and the singlet. */
record DiagramStyle(String open, String close, String singlet) {
    static final DiagramStyle STANDARD = new DiagramStyle("\\yng(", ")", "\\bullet");

    String write(List<Integer> rows) {
        return rows.isEmpty()
                ? singlet
                : rows.stream().map(String::valueOf).collect(Collectors.joining(",", open, close));
    }
}
