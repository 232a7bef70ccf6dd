package irreproof.notation;

import irreproof.notation.Expression.Conjugate;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Statements as compact text for fixtures: {@code (x b3 ~b3) = (+ b1 b8)}. A face is a letter in front ({@code b} bold,
 * {@code u} underlined), a bar a tilde; then primes, {@code _label}, {@code :S} or {@code :A}, {@code @charges},
 * {@code {other}}. Lists keep their brackets, diagrams stand in angles.
 */
final class Written {
    private Written() {}

    static String statement(Statement statement) {
        StringBuilder text = new StringBuilder(tree(statement.sides().get(0)));
        for (int i = 0; i < statement.relations().size(); i++) {
            text.append(' ')
                    .append(relation(statement.relations().get(i)))
                    .append(' ')
                    .append(tree(statement.sides().get(i + 1)));
        }
        statement.problems().forEach(problem -> text.append(" !! ").append(problem.message()));
        return text.toString();
    }

    static String statements(List<Statement> statements) {
        return statements.isEmpty()
                ? "none"
                : statements.stream().map(Written::statement).collect(Collectors.joining(" ;; "));
    }

    private static String relation(Relation relation) {
        String sign = switch (relation.kind()) {
            case EQUAL -> "=";
            case ARROW -> "->";
            case CELL -> "cell";
            case CONTAINS -> ">";
            case CONTAINED -> "<";
        };
        return (relation.negated() ? "!" : "") + sign;
    }

    static String tree(Expression tree) {
        if (tree instanceof Sum sum) {
            return "(+ " + all(sum.terms(), " ") + ")";
        }
        if (tree instanceof Product product) {
            return "(x " + all(product.factors(), " ") + ")";
        }
        if (tree instanceof Multiple multiple) {
            return "(" + multiple.count() + " * " + tree(multiple.body()) + ")";
        }
        if (tree instanceof Power power) {
            String kind = switch (power.kind()) {
                case TENSOR -> "";
                case SYMMETRIC -> "S";
                case EXTERIOR -> "A";
            };
            return "(" + kind + "^" + power.exponent() + " " + tree(power.base()) + ")";
        }
        if (tree instanceof Part part) {
            return "(" + part.symmetry().name().charAt(0) + " " + tree(part.body()) + ")";
        }
        if (tree instanceof Conjugate conjugate) {
            return "(~ " + tree(conjugate.body()) + ")";
        }
        if (tree instanceof Dots) {
            return "...";
        }
        Expression.Name name = (Expression.Name) tree;
        return "~".repeat(name.decoration().bars()) + name(name) + decoration(name.decoration());
    }

    private static String name(Expression.Name name) {
        if (name instanceof NumberName number) {
            String face = switch (number.face()) {
                case PLAIN -> "";
                case BOLD -> "b";
                case UNDERLINED -> "u";
            };
            return face + number.numerator() + (number.denominator() == 1 ? "" : "/" + number.denominator());
        }
        if (name instanceof ListName list) {
            return list.bracket() == Expression.Bracket.ROUND
                    ? "(" + all(list.entries(), ",") + ")"
                    : "[" + all(list.entries(), ",") + "]";
        }
        return "<" + ((DiagramName) name).rows().stream().map(String::valueOf).collect(Collectors.joining(" ")) + ">";
    }

    private static String decoration(Decoration decoration) {
        return "'".repeat(decoration.primes())
                + (decoration.label().isEmpty() ? "" : "_" + decoration.label())
                + (decoration.symmetry() == null
                        ? ""
                        : ":" + decoration.symmetry().name().charAt(0))
                + (decoration.charges().isEmpty() ? "" : "@" + String.join(",", decoration.charges()))
                + (decoration.other().isEmpty() ? "" : "{" + decoration.other() + "}");
    }

    private static String all(List<Expression> trees, String separator) {
        return trees.stream().map(Written::tree).collect(Collectors.joining(separator));
    }
}
