package irreproof.server;

import java.io.InputStream;
import java.io.OutputStream;

/** Entry to the language server. */
public final class ServerMain {
    private ServerMain() {}

    /**
     * Serves until the client says exit or closes its end.
     *
     * @return the process exit code
     */
    public static int run(InputStream in, OutputStream out) {
        throw new UnsupportedOperationException("in the making");
    }
}
