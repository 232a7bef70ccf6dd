package irreproof.workspace;

import java.nio.file.Path;

/**
 * One file to check.
 *
 * @param shown its path as the user should read it: what was typed, and below a folder what follows, with {@code /}
 */
public record SourceFile(Path file, String shown) {}
