package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.WeylDimension;
import java.math.BigInteger;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Spin j has dimension 2j+1: common practice. */
class SpinsTest {
    @Test
    void spinsAndDimensionsAgree() {
        for (int twice = 0; twice <= 40; twice++) {
            DominantWeight irrep = Spins.irrep(BigInteger.valueOf(twice), 2).orElseThrow();
            assertEquals(Rational.of(twice, 2), Spins.spin(irrep));
            assertEquals(
                    BigInteger.valueOf(twice + 1),
                    WeylDimension.dimension(LieGroup.su(2).algebra(), irrep));
        }
        assertEquals(Spins.irrep(BigInteger.TWO, 2), Spins.irrep(BigInteger.ONE, 1));
    }

    @Test
    void refusesWhatIsNoSpin() {
        assertEquals(Optional.empty(), Spins.irrep(BigInteger.ONE, 3));
        assertEquals(Optional.empty(), Spins.irrep(BigInteger.valueOf(-1), 2));
        assertEquals(Optional.empty(), Spins.irrep(BigInteger.TEN.pow(20), 1));
        assertThrows(IllegalArgumentException.class, () -> Spins.spin(DominantWeight.of(1, 0)));
    }
}
