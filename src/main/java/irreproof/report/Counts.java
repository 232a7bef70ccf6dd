package irreproof.report;

import irreproof.check.FileReport;
import irreproof.check.Severity;
import irreproof.check.StatementReport;
import irreproof.check.Verdict;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** How many statements got which verdict, how many findings weigh how much, and why statements are undecided. */
final class Counts {
    private final int files;
    private final Map<Verdict, Integer> verdicts = new EnumMap<>(Verdict.class);
    private final Map<Severity, Integer> severities = new EnumMap<>(Severity.class);
    private final Map<String, Integer> reasons = new TreeMap<>();

    Counts(List<FileReport> reports) {
        files = reports.size();
        for (FileReport report : reports) {
            for (StatementReport statement : report.statements()) {
                verdicts.merge(statement.verdict(), 1, Integer::sum);
                if (statement.verdict() == Verdict.UNDECIDED) {
                    reasons.merge(statement.reason(), 1, Integer::sum);
                }
            }
            report.allFindings().forEach(finding -> severities.merge(finding.severity(), 1, Integer::sum));
        }
    }

    int files() {
        return files;
    }

    int statements() {
        return verdicts.values().stream().mapToInt(Integer::intValue).sum();
    }

    int of(Verdict verdict) {
        return verdicts.getOrDefault(verdict, 0);
    }

    int of(Severity severity) {
        return severities.getOrDefault(severity, 0);
    }

    /** Reasons for being undecided with their counts, the most frequent first. */
    List<Map.Entry<String, Integer>> reasons() {
        return reasons.entrySet().stream()
                .sorted(Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder())
                        .thenComparing(Map.Entry.comparingByKey()))
                .toList();
    }
}
