package irreproof.check;

import irreproof.text.Span;
import java.util.List;

/**
 * What the user sees.
 *
 * @param rule the rule's name, as used after "allow"
 * @param message what is wrong and the shortest proof, one sentence without a full stop, plain text
 * @param evidence further arguments, best first, one line each, plain text; may be empty
 */
public record Finding(
        String rule, Severity severity, Span span, String message, List<String> evidence, List<Fix> fixes) {
    public Finding {
        evidence = List.copyOf(evidence);
        fixes = List.copyOf(fixes);
    }
}
