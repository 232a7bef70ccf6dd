package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.RepresentationRing.CentralCharacter;
import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;

class ReductiveRingTest {
    private static final SimpleAlgebra SU2 = new SimpleAlgebra(Series.A, 1);
    private static final SimpleAlgebra SU3 = new SimpleAlgebra(Series.A, 2);
    private static final ReductiveRing STANDARD_MODEL = new ReductiveRing(new ReductiveAlgebra(List.of(SU3, SU2), 1));
    private static final Budget FREE = Budget.unlimited();

    private static ReductiveIrrep irrep(int a, int b, int c, Rational charge) {
        return new ReductiveIrrep(List.of(DominantWeight.of(a, b), DominantWeight.of(c)), List.of(charge));
    }

    private static final ReductiveIrrep QUARK = irrep(1, 0, 1, Rational.of(1, 6));

    /** Common practice: (3,2)(1/6) squared is (6,3) + (6,1) + (3bar,3) + (3bar,1) with charge 1/3. */
    @Test
    void multipliesFactorByFactor() {
        Rational charge = Rational.of(1, 3);
        Decomposition<ReductiveIrrep> symmetric =
                Decomposition.sum(List.of(irrep(2, 0, 2, charge), irrep(0, 1, 0, charge)));
        Decomposition<ReductiveIrrep> antisymmetric =
                Decomposition.sum(List.of(irrep(2, 0, 0, charge), irrep(0, 1, 2, charge)));
        assertEquals(symmetric.plus(antisymmetric), STANDARD_MODEL.product(QUARK, QUARK, FREE));
        assertEquals(symmetric, STANDARD_MODEL.symmetricPower(QUARK, 2, FREE));
        assertEquals(antisymmetric, STANDARD_MODEL.exteriorPower(QUARK, 2, FREE));
    }

    @Test
    void conjugationNegatesCharges() {
        ReductiveIrrep conjugate = STANDARD_MODEL.conjugate(QUARK);
        assertEquals(irrep(0, 1, 1, Rational.of(-1, 6)), conjugate);
        assertEquals(1, STANDARD_MODEL.product(QUARK, conjugate, FREE).multiplicity(STANDARD_MODEL.trivial()));
    }

    /** The exterior algebra of a six-dimensional irrep has dimension 64, and its top is (1,1)(1). */
    @Test
    void exteriorPowersEndWithTheDeterminant() {
        BigInteger total = BigInteger.ZERO;
        for (int k = 0; k <= 7; k++) {
            Decomposition<ReductiveIrrep> power = STANDARD_MODEL.exteriorPower(QUARK, k, FREE);
            total = total.add(STANDARD_MODEL.dimension(power));
            BigInteger dual = STANDARD_MODEL.dimension(
                    k > 6 ? Decomposition.zero() : STANDARD_MODEL.exteriorPower(QUARK, 6 - k, FREE));
            assertEquals(dual, STANDARD_MODEL.dimension(power));
        }
        assertEquals(BigInteger.valueOf(64), total);
        assertEquals(Decomposition.of(irrep(0, 0, 0, Rational.ONE)), STANDARD_MODEL.exteriorPower(QUARK, 6, FREE));
        assertEquals(Decomposition.of(irrep(0, 1, 1, Rational.of(5, 6))), STANDARD_MODEL.exteriorPower(QUARK, 5, FREE));
    }

    /** A ring with one simple factor and no charge is that factor's ring. */
    @Test
    void agreesWithTheRingOfItsFactor() {
        SimpleAlgebra so8 = new SimpleAlgebra(Series.D, 4);
        ReductiveRing ring = new ReductiveRing(ReductiveAlgebra.of(so8));
        LieRing simple = new LieRing(so8);
        DominantWeight spinor = DominantWeight.of(0, 0, 0, 1);
        for (int k = 0; k <= 5; k++) {
            assertEquals(
                    wrapped(simple.symmetricPower(spinor, k, FREE)), ring.symmetricPower(wrapped(spinor), k, FREE));
            assertEquals(wrapped(simple.exteriorPower(spinor, k, FREE)), ring.exteriorPower(wrapped(spinor), k, FREE));
        }
        assertEquals(simple.centralCharacter(spinor), ring.centralCharacter(wrapped(spinor)));
    }

    private static ReductiveIrrep wrapped(DominantWeight weight) {
        return new ReductiveIrrep(List.of(weight), List.of());
    }

    private static Decomposition<ReductiveIrrep> wrapped(Decomposition<DominantWeight> sum) {
        Decomposition<ReductiveIrrep> result = Decomposition.zero();
        for (var term : sum.multiplicities().entrySet()) {
            result = result.plus(Decomposition.of(wrapped(term.getKey())), term.getValue());
        }
        return result;
    }

    @Test
    void centralCharactersNameWhatTheyHold() {
        assertEquals(
                new CentralCharacter("N-ality and charge", "(1,1; 1/6)"),
                STANDARD_MODEL.centralCharacter(QUARK).orElseThrow());
    }

    @Test
    void refusesIrrepsOfOtherAlgebras() {
        ReductiveIrrep stranger = new ReductiveIrrep(List.of(DominantWeight.of(1)), List.of());
        assertThrows(IllegalArgumentException.class, () -> STANDARD_MODEL.dimension(stranger));
    }
}
