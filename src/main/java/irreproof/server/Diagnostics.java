package irreproof.server;

import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Severity;
import irreproof.check.StatementReport;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticRelatedInformation;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.Location;

/** The findings of one version of a document as the client shows them. */
record Diagnostics(Document document, FileReport report, ClientProfile client) {
    private static final String SOURCE = "irreproof";

    List<Diagnostic> list() {
        List<Diagnostic> result = new ArrayList<>();
        report.findings().forEach(finding -> result.add(of(finding)));
        for (StatementReport statement : report.statements()) {
            for (Finding finding : statement.findings()) {
                Diagnostic diagnostic = of(finding);
                if (client.relatedInformation() && statement.settingPlace() != null) {
                    diagnostic.setRelatedInformation(List.of(settingPlace(statement)));
                }
                result.add(diagnostic);
            }
        }
        return result;
    }

    /** The finding alone, without further places. */
    Diagnostic of(Finding finding) {
        String message = Stream.concat(Stream.of(finding.message()), finding.evidence().stream())
                .collect(Collectors.joining("\n"));
        return new Diagnostic(
                document.places(client.encoding()).range(finding.span()),
                message,
                severity(finding.severity()),
                SOURCE,
                finding.rule());
    }

    private DiagnosticRelatedInformation settingPlace(StatementReport statement) {
        return new DiagnosticRelatedInformation(
                new Location(document.uri(), document.places(client.encoding()).range(statement.settingPlace())),
                "the group " + statement.setting() + " is taken from here");
    }

    private static DiagnosticSeverity severity(Severity severity) {
        return switch (severity) {
            case ERROR -> DiagnosticSeverity.Error;
            case WARNING -> DiagnosticSeverity.Warning;
            case ADVICE -> DiagnosticSeverity.Information;
        };
    }
}
