package irreproof.notation;

import irreproof.text.Span;
import java.util.List;

/**
 * One assertion about representations: sides joined by relations, {@code relations.size() == sides.size() - 1}; a
 * single side (a bare product or sum) has no relation and asserts nothing.
 *
 * @param latex the source text of the span
 * @param continued true if a relation stands before the first side: what it joins could not be read, or stands elsewhere
 * @param problems what in it could not be read, in the author's words; if there are any, the tree may be incomplete and
 *     no semantic finding may be made from it
 */
public record Statement(
        List<Expression> sides,
        List<Relation> relations,
        Span span,
        String latex,
        boolean continued,
        List<Problem> problems) {
    public Statement {
        sides = List.copyOf(sides);
        relations = List.copyOf(relations);
        problems = List.copyOf(problems);
    }

    /** Something inside a statement that could not be read. */
    public record Problem(String message, Span span) {}
}
