package irreproof.server;

import irreproof.budget.Budget;
import irreproof.check.Card;
import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.check.SettingSource;
import irreproof.check.Severity;
import irreproof.check.StatementKind;
import irreproof.check.StatementReport;
import irreproof.check.Verdict;
import irreproof.notation.Statement;
import irreproof.text.SourceText;
import irreproof.text.Span;
import irreproof.text.TextEdit;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A small analysis of its own, so that the server's tests do not move with the rules: it checks that the dimensions in
 * {@code a \otimes b = c \oplus d} add up, and offers to correct the last one. A line {@code group G} names the group.
 */
final class DimensionSums {
    static final String RULE = "dimension-sum";

    private static final Pattern STATEMENT = Pattern.compile("(\\d+) \\\\otimes (\\d+) = (\\d+(?: \\\\oplus \\d+)*)");
    private static final Pattern NUMBER = Pattern.compile("\\d+");
    private static final Pattern GROUP = Pattern.compile("group (\\S+)");

    private DimensionSums() {}

    static FileReport check(SourceText source, CheckOptions options, Budget budget) {
        List<StatementReport> reports = new ArrayList<>();
        Matcher matcher = STATEMENT.matcher(source.content());
        while (matcher.find()) {
            budget.spend(1);
            reports.add(report(source.content(), matcher.toMatchResult(), options.defaultGroup()));
        }
        return new FileReport(source, reports, List.of());
    }

    private static StatementReport report(String text, MatchResult match, String defaultGroup) {
        Span whole = new Span(match.start(), match.end());
        int left = Integer.parseInt(match.group(1)) * Integer.parseInt(match.group(2));
        List<MatchResult> terms = NUMBER.matcher(match.group(3)).results().toList();
        int right =
                terms.stream().mapToInt(term -> Integer.parseInt(term.group())).sum();
        MatchResult lastTerm = terms.get(terms.size() - 1);
        Span last = new Span(match.start(3) + lastTerm.start(), match.start(3) + lastTerm.end());
        String correct = String.valueOf(left - right + Integer.parseInt(lastTerm.group()));
        Finding finding = new Finding(
                RULE,
                Severity.ERROR,
                new Span(match.start(3), match.end(3)),
                "the dimensions differ",
                List.of("left " + left + ", right " + right),
                List.of(new Fix("Replace by " + correct, true, List.of(new TextEdit(last, correct)))));
        Matcher group = GROUP.matcher(text);
        boolean named = group.find();
        String setting = named ? group.group(1) : defaultGroup;
        List<Card> cards = new ArrayList<>();
        cards.add(new Card(whole, match.group(), List.of(new Card.Row("group", setting))));
        NUMBER.matcher(match.group())
                .results()
                .forEach(number -> cards.add(new Card(
                        new Span(match.start() + number.start(), match.start() + number.end()),
                        number.group() + "'",
                        List.of(new Card.Row("dimension", number.group())))));
        return new StatementReport(
                new Statement(List.of(), List.of(), whole, match.group(), false, List.of()),
                StatementKind.PRODUCT,
                setting,
                named ? SettingSource.PROSE : SettingSource.PROJECT,
                named ? new Span(group.start(1), group.end(1)) : null,
                left == right ? Verdict.HOLDS : Verdict.FAILS,
                "",
                left == right ? List.of() : List.of(finding),
                cards);
    }
}
