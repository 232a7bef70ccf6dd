package irreproof.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class RationalTest {
    @Test
    void arithmeticIsExactAndInLowestTerms() {
        Rational half = Rational.of(-3, -6);
        assertEquals("1/2", half.toString());
        assertEquals(Rational.of(5, 6), half.plus(Rational.of(1, 3)));
        assertEquals(Rational.of(1, 6), half.minus(Rational.of(1, 3)));
        assertEquals(Rational.of(-3, 2), half.dividedBy(Rational.of(-1, 3)));
        assertEquals(Rational.ONE, half.times(Rational.of(2)));
        assertEquals(1, half.compareTo(Rational.of(1, 3)));
    }

    @Test
    void lossIsLoud() {
        assertFalse(Rational.of(1, 2).isInteger());
        assertThrows(ArithmeticException.class, () -> Rational.of(1, 2).toIntegerExact());
        assertThrows(ArithmeticException.class, () -> Rational.ONE.dividedBy(Rational.ZERO));
    }
}
