package irreproof.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** Standard input, output and error of this process, or of a test. Text is written in UTF-8. */
record Console(InputStream in, OutputStream out, PrintStream err) {

    /** @throws UserError if the text cannot be written: a report that got lost must not pass for a clean one */
    void print(String text) throws UserError {
        try {
            out.write(text.getBytes(StandardCharsets.UTF_8));
            out.flush();
        } catch (IOException e) {
            throw new UserError("standard output cannot be written to");
        }
    }
}
