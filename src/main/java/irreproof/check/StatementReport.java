package irreproof.check;

import irreproof.notation.Statement;
import irreproof.text.Span;
import java.util.List;

/**
 * The verdict on one statement.
 *
 * @param setting the group as printed ({@code SU(3)}), or empty
 * @param settingPlace where in the document the setting was found, or null
 * @param reason why it is undecided; empty otherwise
 * @param cards what hover shows, innermost places included; spans may nest
 */
public record StatementReport(
        Statement statement,
        StatementKind kind,
        String setting,
        SettingSource settingSource,
        Span settingPlace,
        Verdict verdict,
        String reason,
        List<Finding> findings,
        List<Card> cards) {
    public StatementReport {
        findings = List.copyOf(findings);
        cards = List.copyOf(cards);
    }
}
