package irreproof.report;

import irreproof.check.FileReport;
import java.util.Comparator;
import java.util.List;

/** The one order of all printed reports: by path; inside a file everything has its place already. */
final class Reports {
    private Reports() {}

    static List<FileReport> inOrder(List<FileReport> reports) {
        return reports.stream()
                .sorted(Comparator.comparing(report -> report.source().path()))
                .toList();
    }
}
