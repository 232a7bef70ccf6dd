package irreproof.budget;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.time.Duration;
import org.junit.jupiter.api.Test;

/** A budget ends work that is too long, too late or no longer wanted, and says which. */
final class BudgetTest {
    private static final int MANY = 1 << 20;

    private static BudgetExceeded.Cause cause(Runnable work) {
        return assertThrows(BudgetExceeded.class, work::run).reason();
    }

    private static void spendMany(Budget budget) {
        for (int i = 0; i < MANY; i++) {
            budget.spend(1);
        }
    }

    @Test
    void stepsRunOut() {
        Budget budget = Budget.of(10);
        budget.spend(10);
        assertEquals(BudgetExceeded.Cause.STEPS, cause(() -> budget.spend(1)));
    }

    @Test
    void workKnownToBeTooLargeDoesNotStart() {
        Budget budget = Budget.of(10);
        budget.spend(4);
        assertDoesNotThrow(() -> budget.require(BigInteger.valueOf(6), "a product"));
        assertEquals(BudgetExceeded.Cause.TOO_LARGE, cause(() -> budget.require(BigInteger.valueOf(7), "a product")));
    }

    @Test
    void cancellationReachesEveryBudgetOfTheSameWork() throws InterruptedException {
        Budget whole = Budget.unlimited();
        Budget part = whole.withSteps(Long.MAX_VALUE);
        Thread other = new Thread(whole::cancel);
        other.start();
        other.join();
        assertTrue(part.isCancelled());
        assertEquals(BudgetExceeded.Cause.CANCELLED, cause(() -> spendMany(part)));
    }

    @Test
    void aPartHasItsOwnSteps() {
        Budget whole = Budget.of(10);
        whole.spend(10);
        assertDoesNotThrow(() -> whole.withSteps(5).spend(5));
    }

    @Test
    void aDeadlineThatHasPassedEndsTheWork() {
        Budget late = Budget.of(Long.MAX_VALUE, Duration.ofNanos(-1));
        assertEquals(BudgetExceeded.Cause.TIME, cause(() -> spendMany(late)));
        assertEquals(BudgetExceeded.Cause.TIME, cause(() -> spendMany(late.withSteps(MANY))));
    }
}
