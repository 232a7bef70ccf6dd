package irreproof.notation;

import java.util.List;

/**
 * What stands between two breaks of a passage: sides with the relations between them.
 *
 * @param sides one more than the relations; a side may be empty
 * @param listed true if a comma or words, rather than space or the end of a row, set it apart from the segment before
 */
record Segment(List<List<Lexeme>> sides, List<Lexeme> relations, boolean listed) {
    boolean isEmpty() {
        return relations.isEmpty() && sides.get(0).isEmpty();
    }
}
