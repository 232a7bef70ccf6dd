package irreproof.check.judge;

import irreproof.notation.Expression;
import irreproof.notation.Expression.Name;
import irreproof.notation.Relation;
import irreproof.notation.Statement;
import java.util.ArrayList;
import java.util.List;

/**
 * The pairs of sides of a statement that must be held against each other. Sides joined by equality form a run; in a run
 * every side is held against the first one that multiplies (or, if none does, the first one without dots).
 */
public final class Chain {
    private Chain() {}

    /**
     * One comparison to make.
     *
     * @param loose why the two sides may differ all the same, for what lies between them; empty for an equation
     */
    public record Link(int side, int against, Comparison.Kind kind, String loose) {
        /** True if the sides are claimed to be equal, without a doubt. */
        public boolean isEquation() {
            return kind == Comparison.Kind.EQUAL && loose.isEmpty();
        }
    }

    /** The comparisons a statement asks for, in the order of the sides. */
    public static List<Link> links(Statement statement) {
        List<Link> links = new ArrayList<>();
        int start = 0;
        for (int i = 0; i <= statement.relations().size(); i++) {
            boolean runEnds = i == statement.relations().size()
                    || !joins(statement.relations().get(i));
            if (runEnds) {
                addRun(statement, start, i, links);
                start = i + 1;
            }
            if (runEnds && i < statement.relations().size()) {
                links.add(acrossRuns(statement.relations().get(i), i));
            }
        }
        return links;
    }

    /** The side that decides in the run that begins at the first side. */
    public static int reference(Statement statement) {
        int end = 0;
        while (end < statement.relations().size() && joins(statement.relations().get(end))) {
            end++;
        }
        return reference(statement.sides(), 0, end);
    }

    /** True if no side multiplies, and single names stand against sums: the shape of a branching rule. */
    public static boolean looksLikeBranching(Statement statement) {
        List<Expression> sides = statement.sides();
        boolean multiplied = sides.stream().anyMatch(Names::multiplies);
        boolean single = sides.stream().anyMatch(Name.class::isInstance);
        boolean several = sides.stream().anyMatch(side -> !(side instanceof Name));
        boolean arrow = statement.relations().stream().anyMatch(relation -> relation.kind() == Relation.Kind.ARROW);
        return !multiplied && (single && several || arrow);
    }

    private static boolean joins(Relation relation) {
        return !relation.negated()
                && switch (relation.kind()) {
                    case EQUAL, ARROW, CELL -> true;
                    case CONTAINS, CONTAINED -> false;
                };
    }

    private static String loose(Relation relation) {
        return switch (relation.kind()) {
            case ARROW -> "this relation behind a product may mean a projection";
            case CELL -> "the cells of a table's row need not be equal";
            case EQUAL, CONTAINS, CONTAINED -> "";
        };
    }

    private static int reference(List<Expression> sides, int first, int last) {
        for (int i = first; i <= last; i++) {
            if (Names.multiplies(sides.get(i)) && !Names.isOpen(sides.get(i))) {
                return i;
            }
        }
        for (int i = first; i <= last; i++) {
            if (!Names.isOpen(sides.get(i))) {
                return i;
            }
        }
        return first;
    }

    private static void addRun(Statement statement, int first, int last, List<Link> links) {
        List<Expression> sides = statement.sides();
        int reference = reference(sides, first, last);
        if (Names.isOpen(sides.get(reference))) {
            return;
        }
        for (int i = first; i <= last; i++) {
            if (i == reference || Names.isOnlyDots(sides.get(i))) {
                continue;
            }
            String loose = statement.relations().subList(Math.min(i, reference), Math.max(i, reference)).stream()
                    .map(Chain::loose)
                    .filter(reason -> !reason.isEmpty())
                    .findFirst()
                    .orElse("");
            Comparison.Kind kind = Names.isOpen(sides.get(i)) ? Comparison.Kind.PART_OF : Comparison.Kind.EQUAL;
            links.add(new Link(i, reference, kind, loose));
        }
    }

    private static Link acrossRuns(Relation relation, int left) {
        int right = left + 1;
        boolean not = relation.negated();
        return switch (relation.kind()) {
            case CONTAINS -> new Link(right, left, not ? Comparison.Kind.NOT_PART_OF : Comparison.Kind.PART_OF, "");
            case CONTAINED -> new Link(left, right, not ? Comparison.Kind.NOT_PART_OF : Comparison.Kind.PART_OF, "");
            case EQUAL, ARROW, CELL -> new Link(right, left, Comparison.Kind.DIFFERENT, "");
        };
    }
}
