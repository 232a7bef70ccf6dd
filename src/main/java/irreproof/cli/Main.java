package irreproof.cli;

import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** Entry to the program. */
public final class Main {
    private Main() {}

    public static void main(String[] arguments) {
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        // Standard output belongs to the report, or to the server's protocol: a stray print must not get there.
        System.setOut(err);
        int code = CommandLineProgram.run(
                arguments,
                new Console(new FileInputStream(FileDescriptor.in), new FileOutputStream(FileDescriptor.out), err));
        System.exit(code);
    }
}
