package irreproof.report;

import com.google.gson.stream.JsonWriter;
import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.check.StatementReport;
import irreproof.check.Verdict;
import irreproof.text.LineIndex;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Comparator;
import java.util.List;

/**
 * Reports as one JSON object, for other programs. Lines and columns start at 1, columns count UTF-16 units, ends are
 * exclusive. Keys may be added in later versions; those there now stay and keep their meaning and order.
 */
public final class JsonReport {
    private final JsonWriter json;

    private JsonReport(JsonWriter json) {
        this.json = json;
    }

    /** The whole report, ending in a line end. */
    public static String print(List<FileReport> reports, String version) {
        StringWriter text = new StringWriter();
        try (JsonWriter writer = new JsonWriter(text)) {
            writer.setIndent("  ");
            new JsonReport(writer).report(Reports.inOrder(reports), version);
        } catch (IOException e) {
            throw new UncheckedIOException("a string writer cannot fail", e);
        }
        return text.append('\n').toString();
    }

    private void report(List<FileReport> reports, String version) throws IOException {
        json.beginObject();
        json.name("tool").beginObject();
        json.name("name").value("irreproof").name("version").value(version).endObject();
        json.name("files").beginArray();
        for (FileReport report : reports) {
            file(report);
        }
        json.endArray();
        Counts counts = new Counts(reports);
        json.name("summary").beginObject();
        json.name("statements").value(counts.statements());
        for (Verdict verdict : Verdict.values()) {
            json.name(verdict.word()).value(counts.of(verdict));
        }
        json.endObject().endObject();
    }

    private void file(FileReport report) throws IOException {
        LineIndex lines = report.source().lines();
        json.beginObject().name("path").value(report.source().path());
        json.name("statements").beginArray();
        for (StatementReport statement : report.statements()) {
            statement(statement, lines);
        }
        json.endArray();
        findings(report.findings(), lines);
        json.endObject();
    }

    private void statement(StatementReport report, LineIndex lines) throws IOException {
        json.beginObject();
        range(report.statement().span(), lines);
        json.name("latex").value(report.statement().latex());
        json.name("kind").value(report.kind().word());
        json.name("setting").value(report.setting());
        json.name("settingSource").value(report.settingSource().word());
        json.name("verdict").value(report.verdict().word());
        if (report.verdict() == Verdict.UNDECIDED) {
            json.name("reason").value(report.reason());
        }
        findings(report.findings(), lines);
        json.endObject();
    }

    private void findings(List<Finding> findings, LineIndex lines) throws IOException {
        json.name("findings").beginArray();
        List<Finding> ordered = findings.stream()
                .sorted(Comparator.comparingInt(
                                (Finding finding) -> finding.span().start())
                        .thenComparing(Finding::rule))
                .toList();
        for (Finding finding : ordered) {
            json.beginObject();
            json.name("rule").value(finding.rule());
            json.name("severity").value(finding.severity().word());
            json.name("message").value(finding.message());
            range(finding.span(), lines);
            json.name("fixes").beginArray();
            for (Fix fix : finding.fixes()) {
                fix(fix, lines);
            }
            json.endArray().endObject();
        }
        json.endArray();
    }

    private void fix(Fix fix, LineIndex lines) throws IOException {
        json.beginObject().name("title").value(fix.title());
        json.name("kind").value(fix.safe() ? "safe" : "suggested");
        json.name("edits").beginArray();
        for (TextEdit edit : fix.edits()) {
            json.beginObject();
            range(edit.span(), lines);
            json.name("newText").value(edit.newText()).endObject();
        }
        json.endArray().endObject();
    }

    private void range(Span span, LineIndex lines) throws IOException {
        json.name("range").beginObject();
        position("start", lines.position(span.start()));
        position("end", lines.position(span.end()));
        json.endObject();
    }

    private void position(String name, LineIndex.Position position) throws IOException {
        json.name(name).beginObject();
        json.name("line").value(position.line() + 1L);
        json.name("column").value(position.column() + 1L).endObject();
    }
}
