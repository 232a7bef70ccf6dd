package irreproof.check;

import irreproof.check.judge.Chain;
import irreproof.check.judge.Names;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Relation;
import irreproof.notation.Statement;

/** Tells what sort of assertion a statement makes, from its form alone. */
final class Kinds {
    private Kinds() {}

    static StatementKind of(Statement statement) {
        if (statement.sides().stream().anyMatch(Kinds::hasPower)) {
            return StatementKind.POWER;
        }
        if (statement.sides().stream().anyMatch(Names::multiplies)) {
            return StatementKind.PRODUCT;
        }
        boolean contains = statement.relations().stream()
                .anyMatch(relation ->
                        relation.kind() == Relation.Kind.CONTAINS || relation.kind() == Relation.Kind.CONTAINED);
        if (contains) {
            return StatementKind.CONTAINMENT;
        }
        return Chain.looksLikeBranching(statement) ? StatementKind.BRANCHING : StatementKind.OTHER;
    }

    private static boolean hasPower(Expression expression) {
        return expression instanceof Power
                || expression instanceof Part
                || expression.parts().stream().anyMatch(Kinds::hasPower);
    }
}
