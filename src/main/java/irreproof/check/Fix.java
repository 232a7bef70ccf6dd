package irreproof.check;

import irreproof.text.TextEdit;
import java.util.List;

/** Edits that would mend a finding. Safe ones may be applied in bulk; in mathematics most are only suggested. */
public record Fix(String title, boolean safe, List<TextEdit> edits) {
    public Fix {
        edits = List.copyOf(edits);
    }
}
