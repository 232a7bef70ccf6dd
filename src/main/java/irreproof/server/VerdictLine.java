package irreproof.server;

import irreproof.check.SettingSource;
import irreproof.check.StatementReport;
import irreproof.text.LineIndex;

/** Says in one line what is known of a statement and where its group comes from. */
record VerdictLine(StatementReport report, LineIndex lines) {

    /** For example {@code fails in SU(3), named in line 14}. */
    String text() {
        StringBuilder line = new StringBuilder(report.verdict().word());
        if (!report.setting().isEmpty()) {
            line.append(" in ").append(report.setting());
            String source = source(report.settingSource());
            line.append(source.isEmpty() ? "" : ", " + source);
        }
        return report.reason().isEmpty()
                ? line.toString()
                : line.append(": ").append(report.reason()).toString();
    }

    private String source(SettingSource source) {
        return switch (source) {
            case DIRECTIVE -> "from the directive" + place();
            case STATEMENT -> "named in the statement";
            case PROSE -> "named" + place();
            case HEADING -> "from the heading" + place();
            case PROJECT -> "as set for the project";
            case INFERRED -> "which is inferred";
            case NONE -> "";
        };
    }

    private String place() {
        return report.settingPlace() == null
                ? " elsewhere"
                : " in line " + (lines.position(report.settingPlace().start()).line() + 1);
    }
}
