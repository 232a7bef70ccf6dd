package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.engine.RepresentationRing;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.Symmetry;
import java.util.Collection;
import java.util.List;
import java.util.Optional;

/**
 * What names mean in one setting: joins the notation, which knows no mathematics, to a group's irreps.
 *
 * @param <I> the irreps
 */
public interface Lexicon<I extends Comparable<? super I>> {
    RepresentationRing<I> ring();

    /**
     * The ways to take the forms of these names, most usual first; empty if a form has no meaning in this setting.
     *
     * @throws Undecidable if a name has a form that is not judged in this setting
     */
    List<Interpretation> interpretations(Collection<Name> names);

    /** The key of a name under one of the interpretations. */
    NameKey key(Name name, Interpretation interpretation);

    /**
     * What the name, its bars left off, can denote, most usual first; empty if this group has no such irrep.
     *
     * @throws irreproof.budget.BudgetExceeded if the search is too large
     */
    List<Candidate<I>> candidates(Name name, Interpretation interpretation, Budget budget);

    /** Why a failure would not be certain with these names, beyond the readings that were tried; mostly empty. */
    Optional<String> doubt(Collection<Name> names);

    /** The part of a square that a subscript of the name claims, or null if it claims none (or is part of the name). */
    Symmetry claimedPart(Name name);

    /** Whether the name carries an odd number of bars. */
    default boolean isBarred(Name name) {
        return name.decoration().bars() % 2 == 1;
    }
}
