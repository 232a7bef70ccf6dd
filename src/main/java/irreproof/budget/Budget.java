package irreproof.budget;

import java.math.BigInteger;
import java.time.Duration;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * One handle for cancellation, step count and deadline. A step is about one elementary operation of an inner loop (a
 * weight visited, a token expanded). Work calls {@link #spend} as it goes and {@link #require} before anything whose
 * size it can estimate. One budget serves one thread; {@link #cancel} may be called from any other.
 */
public final class Budget {
    private static final long CLOCK_INTERVAL = 1 << 14;

    private final AtomicBoolean cancelled;
    private final long deadlineNanos;
    private final boolean timed;
    private final long limit;
    private long spent;
    private long nextLook;

    private Budget(AtomicBoolean cancelled, long limit, boolean timed, long deadlineNanos) {
        this.cancelled = cancelled;
        this.limit = limit;
        this.timed = timed;
        this.deadlineNanos = deadlineNanos;
    }

    public static Budget unlimited() {
        return new Budget(new AtomicBoolean(), Long.MAX_VALUE, false, 0);
    }

    public static Budget of(long steps) {
        return new Budget(new AtomicBoolean(), steps, false, 0);
    }

    public static Budget of(long steps, Duration time) {
        return new Budget(new AtomicBoolean(), steps, true, System.nanoTime() + time.toNanos());
    }

    /** A fresh step count under the same cancellation and deadline: one per statement of a document. */
    public Budget withSteps(long steps) {
        return new Budget(cancelled, steps, timed, deadlineNanos);
    }

    /** @throws BudgetExceeded if cancelled, late, or out of steps */
    public void spend(long steps) {
        spent += steps;
        if (spent > limit) {
            throw new BudgetExceeded(BudgetExceeded.Cause.STEPS, "the work was stopped after " + limit + " steps");
        }
        if (spent >= nextLook) {
            nextLook = spent + CLOCK_INTERVAL;
            if (cancelled.get()) {
                throw new BudgetExceeded(BudgetExceeded.Cause.CANCELLED, "cancelled");
            }
            if (timed && System.nanoTime() - deadlineNanos > 0) {
                throw new BudgetExceeded(BudgetExceeded.Cause.TIME, "the time limit was reached");
            }
        }
    }

    /**
     * Refuses work before it starts.
     *
     * @param estimate the steps the work will take
     * @param what the work, as the user should read it: "the product 3875 x 3875"
     * @throws BudgetExceeded if the estimate exceeds the steps that are left
     */
    public void require(BigInteger estimate, String what) {
        if (estimate.compareTo(BigInteger.valueOf(limit - spent)) > 0) {
            throw new BudgetExceeded(
                    BudgetExceeded.Cause.TOO_LARGE, what + " is too large (about " + estimate + " steps)");
        }
        spend(0);
    }

    /** The steps that are left before work is stopped. */
    public long remaining() {
        return Math.max(0, limit - spent);
    }

    public void cancel() {
        cancelled.set(true);
    }

    public boolean isCancelled() {
        return cancelled.get();
    }
}
