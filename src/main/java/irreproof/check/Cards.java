package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Judge;
import irreproof.check.judge.Names;
import irreproof.check.judge.Reading;
import irreproof.check.judge.Undecidable;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.naming.Facts;
import irreproof.naming.IrrepFacts;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.Name;
import irreproof.text.SourceText;
import java.util.ArrayList;
import java.util.List;

/** What an editor shows about a statement: each irrep, each product with its decomposition, and the whole. */
final class Cards {
    private final Case subject;
    private final SourceText source;
    private final Budget budget;
    private final List<Card> cards = new ArrayList<>();

    private Cards(Case subject, SourceText source, Budget budget) {
        this.subject = subject;
        this.source = source;
        this.budget = budget;
    }

    static List<Card> of(Case subject, SourceText source, Budget budget) {
        Cards cards = new Cards(subject, source, budget);
        cards.cards.add(cards.whole());
        Reading<DominantWeight> reading = cards.reading();
        if (reading != null) {
            subject.statement().sides().forEach(side -> cards.add(side, reading));
        }
        return cards.cards;
    }

    private Reading<DominantWeight> reading() {
        return subject.ruling().judgement() == null
                ? null
                : subject.ruling().judgement().reading();
    }

    private Card whole() {
        Ruling ruling = subject.ruling();
        List<Card.Row> rows = new ArrayList<>();
        String verdict = ruling.verdict().word();
        rows.add(new Card.Row("verdict", ruling.reason().isEmpty() ? verdict : verdict + ": " + ruling.reason()));
        if (!ruling.settingName().isEmpty()) {
            rows.add(new Card.Row("group", ruling.settingName() + origin(ruling)));
        }
        if (ruling.judgement() != null && !ruling.judgement().values().isEmpty()) {
            List<String> sums = ruling.judgement().values().stream()
                    .map(value -> subject.dimension(value).toString())
                    .toList();
            rows.add(new Card.Row("dimensions", String.join(", ", sums)));
        }
        return new Card(subject.statement().span(), "statement", rows);
    }

    private String origin(Ruling ruling) {
        if (ruling.source() == SettingSource.INFERRED) {
            return ", inferred: the only small group in which this holds";
        }
        if (ruling.source() == SettingSource.PROJECT) {
            return ", the default group";
        }
        if (ruling.setting() == null || ruling.setting().place() == null) {
            return "";
        }
        return ", from line "
                + (source.lines().position(ruling.setting().place().start()).line() + 1);
    }

    private void add(Expression expression, Reading<DominantWeight> reading) {
        boolean unknown = Names.of(expression).stream()
                .anyMatch(subject.ruling().judgement().unknownNames()::contains);
        if (expression instanceof Dots) {
            return;
        }
        if (unknown) {
            expression.parts().forEach(child -> add(child, reading));
            return;
        }
        try {
            Decomposition<DominantWeight> value =
                    Judge.valueOf(expression, subject.ruling().lexicon(), reading, budget.withSteps(Wording.STEPS));
            if (expression instanceof Name name) {
                add(name, value);
            } else if (Names.multiplies(expression)) {
                cards.add(new Card(
                        expression.span(),
                        expression.span().of(source.content()).strip(),
                        List.of(
                                new Card.Row(
                                        "decomposes into", subject.wording().usualSum(value)),
                                new Card.Row(
                                        "dimension", subject.dimension(value).toString()))));
            }
        } catch (Undecidable | ArithmeticException ignored) {
            return;
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
        }
        expression.parts().forEach(child -> add(child, reading));
    }

    private void add(Name name, Decomposition<DominantWeight> value) {
        if (value.isZero()) {
            cards.add(new Card(
                    name.span(),
                    "0 of " + subject.ruling().settingName(),
                    List.of(new Card.Row("Young diagram", "vanishes: a column is longer than N"))));
            return;
        }
        DominantWeight irrep = value.multiplicities().firstKey();
        IrrepFacts facts = Facts.of(subject.ruling().lexicon().group(), irrep, budget.withSteps(Wording.STEPS));
        List<Card.Row> rows = facts.lines().stream()
                .map(line -> new Card.Row(line.label(), line.value()))
                .toList();
        String title =
                subject.wording().usualName(irrep) + " of " + subject.ruling().settingName();
        cards.add(new Card(name.span(), title, rows));
    }
}
