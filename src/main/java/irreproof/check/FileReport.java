package irreproof.check;

import irreproof.text.SourceText;
import java.util.List;

/**
 * All that was found in one source, in document order.
 *
 * @param findings findings that belong to no statement (a directive that cannot be read)
 */
public record FileReport(SourceText source, List<StatementReport> statements, List<Finding> findings) {
    public FileReport {
        statements = List.copyOf(statements);
        findings = List.copyOf(findings);
    }

    /** Every finding of the file, in the order of their places. */
    public List<Finding> allFindings() {
        return java.util.stream.Stream.concat(
                        findings.stream(), statements.stream().flatMap(report -> report.findings().stream()))
                .sorted(java.util.Comparator.comparingInt(
                                (Finding finding) -> finding.span().start())
                        .thenComparing(Finding::rule))
                .toList();
    }
}
