package irreproof.engine.lie;

/**
 * The congruence class of a weight modulo the root lattice: the character of the centre of the simply connected group.
 * Conventions of Slansky (Phys. Rept. 79, 1981; from memory), in Bourbaki labels a_1, a_2, ...:
 *
 * <ul>
 *   <li>A_n: N-ality a_1 + 2 a_2 + ... + n a_n mod n+1;
 *   <li>B_n: a_n mod 2; C_n: a_1 + a_3 + ... mod 2; E7: a_2 + a_5 + a_7 mod 2;
 *   <li>E6: a_1 - a_3 + a_5 - a_6 mod 3;
 *   <li>D_n: the pair (a_{n-1} + a_n mod 2, 2 a_1 + 2 a_3 + ... + (n-2) a_{n-1} + n a_n mod 4), the sum over odd nodes up
 *       to n-2. For odd n the second entry alone is the class in Z_4; for even n it is 0 or 2;
 *   <li>E8, F4, G2: always 0 (modulus 1).
 * </ul>
 *
 * @param first the first entry of D_n's pair, 0 for the other series
 * @param value the class; the second entry of D_n's pair
 * @param modulus of the value: 4 for D_n
 * @param paired true for D_n
 */
public record CongruenceClass(int first, int value, int modulus, boolean paired) {
    public static CongruenceClass of(SimpleAlgebra algebra, DominantWeight weight) {
        algebra.requireWeight(weight);
        int n = algebra.rank();
        return switch (algebra.series()) {
            case A -> cyclic(nality(weight), n + 1);
            case B -> cyclic(weight.label(n - 1), 2);
            case C -> cyclic(oddNodes(weight, n), 2);
            case D -> {
                long before = weight.label(n - 2);
                long last = weight.label(n - 1);
                long second = 2 * oddNodes(weight, n - 2) + (n - 2) * before + n * last;
                yield new CongruenceClass(Math.floorMod(before + last, 2), Math.floorMod(second, 4), 4, true);
            }
            case E ->
                switch (n) {
                    case 6 -> cyclic((long) weight.label(0) - weight.label(2) + weight.label(4) - weight.label(5), 3);
                    case 7 -> cyclic((long) weight.label(1) + weight.label(4) + weight.label(6), 2);
                    default -> cyclic(0, 1);
                };
            case F, G -> cyclic(0, 1);
        };
    }

    private static CongruenceClass cyclic(long value, int modulus) {
        return new CongruenceClass(0, Math.floorMod(value, modulus), modulus, false);
    }

    private static long nality(DominantWeight weight) {
        int modulus = weight.rank() + 1;
        long sum = 0;
        for (int i = 0; i < weight.rank(); i++) {
            sum = (sum + (i + 1L) * weight.label(i)) % modulus;
        }
        return sum;
    }

    /** The sum of the labels at nodes 1, 3, 5, ... up to the given one. */
    private static long oddNodes(DominantWeight weight, int upTo) {
        long sum = 0;
        for (int i = 0; i < upTo; i += 2) {
            sum += weight.label(i);
        }
        return sum;
    }

    /** The class of a product of two irreps with these classes (of one algebra). */
    public CongruenceClass plus(CongruenceClass other) {
        return new CongruenceClass((first + other.first) % 2, (value + other.value) % modulus, modulus, paired);
    }

    /** {@code 2}, or for D_n {@code (0,2)}. */
    @Override
    public String toString() {
        return paired ? "(" + first + "," + value + ")" : Integer.toString(value);
    }
}
