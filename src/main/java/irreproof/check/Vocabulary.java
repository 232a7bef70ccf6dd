package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Interpretation;
import irreproof.check.judge.Interpretation.Diagrams;
import irreproof.check.judge.Interpretation.Numbers;
import irreproof.check.judge.LieLexicon;
import irreproof.check.judge.NameKey;
import irreproof.check.judge.Names;
import irreproof.check.judge.Reading;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.naming.DynkinNumbering;
import irreproof.naming.IrrepLabel;
import irreproof.naming.YoungDiagrams;
import irreproof.notation.Expression;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import irreproof.notation.WrittenTerm;
import irreproof.notation.WrittenTerm.WrittenName;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Names irreps the way one side of a statement does: by dimension, spin, Dynkin labels, rows or columns, or diagram, with
 * the meanings that the statement's reading gives to names. Where the author's kind of name does not do, by dimension;
 * where a dimension name is too long a search, by Dynkin labels.
 */
final class Vocabulary {
    private final LieLexicon lexicon;
    private final Reading<DominantWeight> reading;
    private final Name sample;
    private final long boxes;
    private final Budget budget;

    private Vocabulary(LieLexicon lexicon, Reading<DominantWeight> reading, Name sample, long boxes, Budget budget) {
        this.lexicon = lexicon;
        this.reading = reading;
        this.sample = sample;
        this.boxes = boxes;
        this.budget = budget;
    }

    /** The dimension names of the published tables. */
    static Vocabulary ofTables(LieLexicon lexicon, Budget budget) {
        return new Vocabulary(lexicon, null, null, 0, budget);
    }

    static Vocabulary ofSide(
            Expression side, Statement statement, LieLexicon lexicon, Reading<DominantWeight> reading, Budget budget) {
        List<Name> names = Names.of(side);
        Name sample = names.isEmpty() ? Names.of(statement.sides().get(0)).get(0) : names.get(0);
        long boxes = names.stream()
                .filter(DiagramName.class::isInstance)
                .mapToLong(name -> ((DiagramName) name)
                        .rows().stream().mapToLong(Integer::longValue).sum())
                .max()
                .orElse(0);
        return new Vocabulary(lexicon, reading, sample, boxes, budget);
    }

    WrittenName name(DominantWeight irrep) {
        if (reading == null) {
            return ofTables(irrep);
        }
        Interpretation interpretation = reading.interpretation();
        if (sample instanceof DiagramName) {
            return new WrittenTerm.Diagram(
                    diagram(interpretation.diagrams() == Diagrams.CONJUGATE ? conjugate(irrep) : irrep));
        }
        if (sample instanceof ListName) {
            return list(irrep, interpretation);
        }
        return interpretation.numbers() == Numbers.SPIN ? new WrittenTerm.Spin(irrep.label(0)) : dimension(irrep);
    }

    /** With columns of full height put in front, up to the number of boxes the author draws. */
    private List<Integer> diagram(DominantWeight irrep) {
        List<Integer> rows = YoungDiagrams.rows(irrep);
        int height = lexicon.group().degree();
        long missing = boxes - rows.stream().mapToLong(Integer::longValue).sum();
        if (missing <= 0 || missing % height != 0) {
            return rows;
        }
        List<Integer> full = new ArrayList<>();
        for (int i = 0; i < height; i++) {
            full.add((i < rows.size() ? rows.get(i) : 0) + (int) (missing / height));
        }
        return full;
    }

    private WrittenName list(DominantWeight irrep, Interpretation interpretation) {
        return switch (interpretation.lists()) {
            case DYNKIN_BOURBAKI -> labels(irrep);
            case DYNKIN_SLANSKY -> new WrittenTerm.Labels(DynkinNumbering.inSlanskysOrder(lexicon.group(), irrep));
            case PARTITION_ROWS -> new WrittenTerm.Labels(diagram(irrep));
            case PARTITION_COLUMNS -> new WrittenTerm.Labels(columns(diagram(irrep)));
            case TENSOR_RANK, GROUPED -> dimension(irrep);
        };
    }

    private static WrittenTerm.Labels labels(DominantWeight irrep) {
        return new WrittenTerm.Labels(Arrays.stream(irrep.labels()).boxed().toList());
    }

    private static List<Integer> columns(List<Integer> rows) {
        List<Integer> columns = new ArrayList<>();
        int longest = rows.isEmpty() ? 0 : rows.get(0);
        for (int column = 1; column <= longest; column++) {
            int place = column;
            columns.add((int) rows.stream().filter(row -> row >= place).count());
        }
        return columns;
    }

    /** A name that the reading gives to the irrep; otherwise the one of the tables. */
    private WrittenName dimension(DominantWeight irrep) {
        Decomposition<DominantWeight> plain = Decomposition.of(irrep);
        Decomposition<DominantWeight> barred = Decomposition.of(conjugate(irrep));
        for (Map.Entry<NameKey, Decomposition<DominantWeight>> meaning :
                meanings().entrySet()) {
            if (meaning.getValue().equals(plain)) {
                return written(meaning.getKey(), irrep, 0);
            }
        }
        for (Map.Entry<NameKey, Decomposition<DominantWeight>> meaning :
                meanings().entrySet()) {
            if (meaning.getValue().equals(barred)) {
                return written(meaning.getKey(), irrep, 1);
            }
        }
        return ofTables(irrep);
    }

    private Map<NameKey, Decomposition<DominantWeight>> meanings() {
        Map<NameKey, Decomposition<DominantWeight>> meanings = new TreeMap<>(Comparator.comparing(NameKey::text));
        reading.meanings().forEach((key, candidate) -> {
            if (!key.family().isEmpty()) {
                meanings.put(key, candidate.value());
            }
        });
        return meanings;
    }

    private WrittenName written(NameKey key, DominantWeight irrep, int bars) {
        String suffix = key.text().substring(key.family().length() + key.number());
        return new WrittenTerm.Dimension(lexicon.dimension(irrep), bars, key.number(), suffix);
    }

    private WrittenName ofTables(DominantWeight irrep) {
        try {
            IrrepLabel label = lexicon.dimensionNames().labelOf(irrep, budget.withSteps(Wording.STEPS));
            return new WrittenTerm.Dimension(label.dimension(), label.barred() ? 1 : 0, label.primes(), label.suffix());
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
            return labels(irrep);
        }
    }

    private DominantWeight conjugate(DominantWeight irrep) {
        return lexicon.ring().conjugate(irrep);
    }
}
