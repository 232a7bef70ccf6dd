package irreproof.notation;

import java.util.List;
import java.util.stream.Collectors;

/** How Dynkin labels are written: what stands before, between and behind the entries. */
record ListStyle(String open, String separator, String close) {
    static final ListStyle STANDARD = new ListStyle("(", ",", ")");

    String write(List<Integer> labels) {
        return labels.stream().map(String::valueOf).collect(Collectors.joining(separator, open, close));
    }
}
