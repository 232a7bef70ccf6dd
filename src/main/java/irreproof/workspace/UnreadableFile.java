package irreproof.workspace;

/** A file or folder that cannot be read; the message says which and why, in plain words, without a full stop. */
public final class UnreadableFile extends Exception {
    private static final long serialVersionUID = 1;

    public UnreadableFile(String message) {
        super(message);
    }
}
