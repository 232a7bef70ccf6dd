package irreproof.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.util.List;
import org.junit.jupiter.api.Test;

class JsonReportTest {
    /** Compared as values, in which the order of keys counts. */
    private static final String PAPER = """
            {"tool": {"name": "irreproof", "version": "1.2.3"},
             "files": [
              {"path": "a.tex", "statements": [], "findings": []},
              {"path": "paper/main.tex", "statements": [
               {"range": {"start": {"line": 2, "column": 14}, "end": {"line": 2, "column": 38}},
                "latex": "3 \\\\otimes 3 = 6 \\\\oplus 3",
                "kind": "product",
                "setting": "SU(3)", "settingSource": "prose",
                "verdict": "fails",
                "findings": [
                 {"rule": "wrong-summand", "severity": "error",
                  "message": "6 and 3 are not what 3 times 3 is: missing \\\\bar 3, surplus 3",
                  "range": {"start": {"line": 2, "column": 28}, "end": {"line": 2, "column": 38}},
                  "fixes": [
                   {"title": "replace the right side by", "kind": "suggested",
                    "edits": [
                     {"range": {"start": {"line": 2, "column": 28}, "end": {"line": 2, "column": 38}},
                      "newText": "6 \\\\oplus \\\\bar 3"}]}]}]},
               {"range": {"start": {"line": 3, "column": 2}, "end": {"line": 3, "column": 31}},
                "latex": "3 \\\\otimes \\\\bar 3 = 1 \\\\oplus 8",
                "kind": "product",
                "setting": "SU(3)", "settingSource": "prose",
                "verdict": "holds",
                "findings": []},
               {"range": {"start": {"line": 5, "column": 2}, "end": {"line": 5, "column": 18}},
                "latex": "4 \\\\otimes 4 = 16",
                "kind": "product",
                "setting": "", "settingSource": "none",
                "verdict": "undecided",
                "reason": "no group named",
                "findings": []}],
               "findings": [
                {"rule": "unreadable-directive", "severity": "warning",
                 "message": "this directive cannot be read",
                 "range": {"start": {"line": 1, "column": 14}, "end": {"line": 1, "column": 24}},
                 "fixes": [
                  {"title": "write", "kind": "safe",
                   "edits": [
                    {"range": {"start": {"line": 1, "column": 14}, "end": {"line": 1, "column": 18}},
                     "newText": "group"}]}]}]}],
             "summary": {"statements": 3, "holds": 1, "fails": 1, "undecided": 1}}
            """;

    @Test
    void printsEverythingThereIsInOneOrder() {
        String printed = JsonReport.print(List.of(SampleReports.paper(), SampleReports.empty("a.tex")), "1.2.3");
        assertEquals(
                JsonParser.parseString(PAPER).toString(),
                JsonParser.parseString(printed).toString());
    }

    @Test
    void isLaidOutForReadingAndEndsItsLastLine() {
        assertEquals("""
                {
                  "tool": {
                    "name": "irreproof",
                    "version": "1"
                  },
                  "files": [],
                  "summary": {
                    "statements": 0,
                    "holds": 0,
                    "fails": 0,
                    "undecided": 0
                  }
                }
                """, JsonReport.print(List.of(), "1"));
    }

    @Test
    void columnsCountUtf16Units() {
        String content = "\ud835\udd30\ud835\udd32 x\r\n\ty";
        JsonObject finding = JsonParser.parseString(JsonReport.print(
                        List.of(SampleReports.finding(
                                content, SampleReports.advice(content.indexOf('x'), content.length()))),
                        "1"))
                .getAsJsonObject()
                .getAsJsonArray("files")
                .get(0)
                .getAsJsonObject()
                .getAsJsonArray("findings")
                .get(0)
                .getAsJsonObject();
        assertEquals(
                "{\"start\":{\"line\":1,\"column\":6},\"end\":{\"line\":2,\"column\":3}}",
                finding.get("range").toString());
    }
}
