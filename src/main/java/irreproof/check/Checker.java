package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.DeclaredNames;
import irreproof.latex.LatexDocument;
import irreproof.latex.Passage;
import irreproof.latex.Reader;
import irreproof.naming.Resolution;
import irreproof.notation.Statement;
import irreproof.notation.StatementFinder;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The one function that all front ends call. Pure: the same input gives the same report; safe for many threads. Reads
 * the source, finds the statements, decides each in its setting, then holds the readings of the whole document together.
 */
public final class Checker {
    private final LatexDocument document;
    private final CheckOptions options;
    private final Budget budget;
    private final Directives directives;

    private Checker(LatexDocument document, CheckOptions options, Budget budget) {
        this.document = document;
        this.options = options;
        this.budget = budget;
        this.directives = Directives.read(document.comments());
    }

    /**
     * @throws BudgetExceeded if the budget is cancelled, late, or too small even to read the source
     * @throws IllegalArgumentException if the default group cannot be read
     */
    public static FileReport check(SourceText source, CheckOptions options, Budget budget) {
        List<SourceText> preambles = options.sources().preambles(source.path());
        return new Checker(Reader.read(source, preambles, options.sources(), budget), options, budget).run();
    }

    /** Whether a group typed by the user can be read; the reason if not. */
    public static Optional<String> problemWithGroup(String typed) {
        return typed.isEmpty() || Directives.group(typed).isPresent()
                ? Optional.empty()
                : Optional.of("\"" + typed + "\" is not a group such as SU(5)");
    }

    private record Found(Statement statement, Passage passage) {}

    private FileReport run() {
        List<Found> found = statements();
        Settings settings = new Settings(document, directives, defaultGroup());
        DeclaredNames declared = directives.declaredNames();
        Arbiter arbiter = new Arbiter(declared, budget, options.stepsPerStatement());
        List<Statement> samples = found.stream().map(Found::statement).toList();
        List<Case> cases = new ArrayList<>();
        for (Found place : found) {
            Statement statement = place.statement();
            Ruling ruling = arbiter.decide(
                    statement,
                    settings.candidates(statement.span(), place.passage().span()),
                    settings.speaksOfFiniteGroups(statement.span()));
            cases.add(new Case(statement, ruling, new Wording(document.source(), statement, samples, ruling, budget)));
        }
        return report(cases);
    }

    private FileReport report(List<Case> cases) {
        List<List<Finding>> ofReadings = DocumentReadings.examine(cases);
        List<Span> spans =
                cases.stream().map(subject -> subject.statement().span()).toList();
        Suppressions suppressions = new Suppressions(directives, spans);
        List<StatementReport> reports = new ArrayList<>();
        for (int i = 0; i < cases.size(); i++) {
            Case subject = cases.get(i);
            List<Finding> findings = new ArrayList<>();
            Rules.OF_STATEMENTS.forEach(rule -> findings.addAll(examine(rule, subject)));
            findings.addAll(ofReadings.get(i));
            reports.add(report(subject, suppressions.filter(subject.statement().span(), findings)));
        }
        return new FileReport(document.source(), reports, suppressions.findings(directives));
    }

    private StatementReport report(Case subject, List<Finding> findings) {
        Ruling ruling = subject.ruling();
        Statement statement = subject.statement();
        return new StatementReport(
                statement,
                Kinds.of(statement),
                ruling.settingName(),
                ruling.source(),
                ruling.setting() == null ? null : ruling.setting().place(),
                ruling.verdict(),
                ruling.reason(),
                findings,
                options.cards() ? Cards.of(subject, document.source(), budget) : List.of());
    }

    /** A rule that crashes is one finding that asks for a report; the run goes on. */
    private static List<Finding> examine(StatementRule rule, Case subject) {
        try {
            return rule.examine(subject);
        } catch (BudgetExceeded stopped) {
            throw stopped;
        } catch (RuntimeException crash) {
            if (Boolean.getBoolean("irreproof.rethrow")) {
                throw crash;
            }
            String message = "the rule " + rule.name() + " stopped with " + crash + "; please report this statement";
            return List.of(new Finding(
                    Rules.CRASH, Severity.WARNING, subject.statement().span(), message, List.of(), List.of()));
        }
    }

    private List<Found> statements() {
        List<Found> found = new ArrayList<>();
        for (Passage passage : document.passages()) {
            if (!directives.isPaused(passage.span().start())) {
                for (Statement statement :
                        StatementFinder.find(document.source().content(), passage, budget)) {
                    found.add(new Found(statement, passage));
                }
            }
        }
        return found;
    }

    private Optional<Resolution> defaultGroup() {
        String typed = options.defaultGroup();
        if (typed.isEmpty()) {
            return Optional.empty();
        }
        Optional<Resolution> group = Directives.group(typed);
        if (group.isEmpty()) {
            throw new IllegalArgumentException(problemWithGroup(typed).orElseThrow());
        }
        return group;
    }
}
