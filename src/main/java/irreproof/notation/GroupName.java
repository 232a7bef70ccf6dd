package irreproof.notation;

import irreproof.text.Span;
import java.util.List;

/**
 * A group as an author names it, such as {@code SU(3)}, {@code \mathfrak{so}(10)}, {@code E_6},
 * {@code SU(3)_C\times SU(2)_L\times U(1)_Y}, {@code A_4}, {@code O_h}.
 *
 * @param factors one for each factor of a product
 * @param span where it stands in the main document
 */
public record GroupName(List<Factor> factors, Span span) {
    public GroupName {
        factors = List.copyOf(factors);
    }

    /**
     * One factor. {@code SU(3)_C} is family {@code SU}, arguments {@code [3]}, label {@code C}; {@code su(3)} is the
     * same with {@code algebra} set; {@code E_{7(7)}} is family {@code E}, arguments {@code [7]}; {@code SO(1,9)} is
     * family {@code SO}, arguments {@code [1, 9]}; {@code D_{3h}} is family {@code D}, arguments {@code [3]}, suffix
     * {@code h}; {@code SL(2,\mathbb{C})} is family {@code SL}, arguments {@code [2]}, suffix {@code C} (so too
     * {@code R} and {@code H}); {@code SU(N)} is family {@code SU} without arguments.
     *
     * @param family upper-case as the group is written: SU, SO, Sp, USp, Spin, SL, GL, U, O, E, F, G, A, B, C, D, S, T,
     *     I, Z, Q, ...
     */
    public record Factor(String family, List<Integer> arguments, String suffix, String label, boolean algebra) {
        public Factor {
            arguments = List.copyOf(arguments);
        }
    }
}
