package irreproof.check.judge;

/** Thrown where a statement cannot be judged; the message is the reason the user reads. */
public final class Undecidable extends RuntimeException {
    public Undecidable(String reason) {
        super(reason, null, false, false);
    }
}
