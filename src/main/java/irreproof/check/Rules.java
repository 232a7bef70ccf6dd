package irreproof.check;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The registry of rules, sorted by name; each has a page under {@code irreproof/rules} on the class path. */
public final class Rules {
    static final String CRASH = "internal-error";

    /** The rules that look at one statement. */
    static final List<StatementRule> OF_STATEMENTS = List.of(
            new CongruenceMismatch(),
            new DimensionMismatch(),
            new NoSuchIrrep(),
            new NotContained(),
            new OtherGroup(),
            new WrongDecomposition(),
            new WrongNegation(),
            new WrongSymmetry());

    private Rules() {}

    private record Entry(String name, Severity severity) {}

    private static List<Entry> entries() {
        List<Entry> entries = new ArrayList<>();
        OF_STATEMENTS.forEach(rule -> entries.add(new Entry(rule.name(), rule.severity())));
        entries.add(new Entry(DocumentReadings.CONFLICT, Severity.WARNING));
        entries.add(new Entry(DocumentReadings.UNUSUAL, Severity.ADVICE));
        entries.add(new Entry(Suppressions.UNREADABLE, Severity.WARNING));
        entries.add(new Entry(Suppressions.UNUSED, Severity.WARNING));
        entries.add(new Entry(CRASH, Severity.WARNING));
        entries.sort(java.util.Comparator.comparing(Entry::name));
        return entries;
    }

    public static List<RuleInfo> all() {
        return entries().stream()
                .map(entry -> {
                    String page = page(entry.name());
                    return new RuleInfo(entry.name(), entry.severity(), summary(page), page);
                })
                .toList();
    }

    static boolean isRule(String name) {
        return entries().stream().anyMatch(entry -> entry.name().equals(name));
    }

    private static String page(String name) {
        String resource = "/irreproof/rules/" + name + ".md";
        try (InputStream stream = Rules.class.getResourceAsStream(resource)) {
            if (stream == null) {
                throw new IllegalStateException("no page for the rule " + name);
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    /** The first line of text under the page's title, without its full stop. */
    private static String summary(String page) {
        return page.lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .findFirst()
                .map(line -> line.endsWith(".") ? line.substring(0, line.length() - 1) : line)
                .orElse("");
    }
}
