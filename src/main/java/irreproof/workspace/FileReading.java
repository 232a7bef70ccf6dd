package irreproof.workspace;

import irreproof.text.SourceText;
import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Objects;

/**
 * Reads sources from disk or a stream. The encoding: a byte order mark if there is one (it is not part of the text),
 * else UTF-8, else, since every byte sequence is valid in it, ISO-8859-1.
 */
public final class FileReading {
    /** In bytes. No manuscript comes near; a data file that happens to end in {@code .tex} may. */
    public static final int LARGEST = 16 << 20;

    private FileReading() {}

    /** @param shown the path as the user should read it, which becomes the path of the source */
    public static SourceText read(Path file, String shown) throws UnreadableFile {
        if (Files.isDirectory(file)) {
            throw new UnreadableFile(shown + " is a folder");
        }
        // A named pipe is fine on the command line: its size is unknown (0), and the stream is capped below.
        try (InputStream stream = Files.newInputStream(file)) {
            return read(stream, shown);
        } catch (NoSuchFileException e) {
            throw new UnreadableFile("there is no file " + shown);
        } catch (IOException e) {
            throw new UnreadableFile(shown + " cannot be read");
        }
    }

    public static SourceText read(InputStream stream, String shown) throws UnreadableFile {
        byte[] bytes;
        try {
            // Buffered, because reading a pipe by its file descriptor asks for a position that it does not have.
            bytes = new BufferedInputStream(Objects.requireNonNull(stream)).readNBytes(LARGEST + 1);
        } catch (IOException e) {
            throw new UnreadableFile(shown + " cannot be read");
        }
        if (bytes.length > LARGEST) {
            throw new UnreadableFile(shown + " is larger than " + (LARGEST >> 20) + " MiB and was not read");
        }
        return new SourceText(shown, decode(bytes));
    }

    static String decode(byte[] bytes) {
        if (startsWith(bytes, 0xEF, 0xBB, 0xBF)) {
            return decode(bytes, 3, StandardCharsets.UTF_8);
        }
        if (startsWith(bytes, 0xFE, 0xFF)) {
            return decode(bytes, 2, StandardCharsets.UTF_16BE);
        }
        if (startsWith(bytes, 0xFF, 0xFE)) {
            return decode(bytes, 2, StandardCharsets.UTF_16LE);
        }
        return decode(bytes, 0, StandardCharsets.UTF_8);
    }

    private static String decode(byte[] bytes, int from, Charset charset) {
        ByteBuffer content = ByteBuffer.wrap(bytes, from, bytes.length - from);
        try {
            return charset.newDecoder().decode(content).toString();
        } catch (CharacterCodingException e) {
            return new String(bytes, StandardCharsets.ISO_8859_1);
        }
    }

    private static boolean startsWith(byte[] bytes, int... start) {
        if (bytes.length < start.length) {
            return false;
        }
        for (int i = 0; i < start.length; i++) {
            if ((bytes[i] & 0xFF) != start[i]) {
                return false;
            }
        }
        return true;
    }
}
