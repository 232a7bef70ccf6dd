package irreproof.check;

import irreproof.naming.Resolution;
import irreproof.text.Span;

/**
 * A group that a statement may be about.
 *
 * @param near how near to the statement it was named
 * @param place where, or null
 * @param factor true if it was named as a factor of a product, so that the statement may be about another factor
 */
record SettingCandidate(Resolution group, Nearness near, Span place, boolean factor) {
    /** From the most binding to the least. */
    enum Nearness {
        DIRECTIVE(SettingSource.DIRECTIVE),
        PASSAGE(SettingSource.STATEMENT),
        PARAGRAPH(SettingSource.PROSE),
        HEADING(SettingSource.HEADING),
        DOCUMENT(SettingSource.PROSE),
        DEFAULT(SettingSource.PROJECT);

        private final SettingSource source;

        Nearness(SettingSource source) {
            this.source = source;
        }

        SettingSource source() {
            return source;
        }

        boolean isNearerThan(Nearness other) {
            return compareTo(other) < 0;
        }
    }
}
