package irreproof.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileReadingTest {
    private static final String TEXT = "caf\u00e9 \\otimes";

    @Test
    void readsUtf8() throws UnreadableFile {
        assertEquals(TEXT, read(bytes("", TEXT, StandardCharsets.UTF_8)));
        assertEquals("\ud835\udd30", read("\ud835\udd30".getBytes(StandardCharsets.UTF_8)));
        assertEquals("", read(new byte[0]));
    }

    @Test
    void leavesTheByteOrderMarkOut() throws UnreadableFile {
        assertEquals(TEXT, read(bytes("\ufeff", TEXT, StandardCharsets.UTF_8)));
        assertEquals(TEXT, read(bytes("\ufeff", TEXT, StandardCharsets.UTF_16BE)));
        assertEquals(TEXT, read(bytes("\ufeff", TEXT, StandardCharsets.UTF_16LE)));
    }

    @Test
    void takesWhatIsNotUtf8AsLatin1() throws UnreadableFile {
        assertEquals(TEXT, read(bytes("", TEXT, StandardCharsets.ISO_8859_1)));
        assertEquals("\u00ef\u00bb\u00bf\u00ff", read(new byte[] {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF, (byte) 0xFF}));
    }

    @Test
    void keepsLineEndsAsTheyAre() throws UnreadableFile {
        assertEquals("a\r\nb\rc\n", read("a\r\nb\rc\n".getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void refusesWhatIsTooLarge() throws UnreadableFile {
        byte[] largest = new byte[FileReading.LARGEST];
        Arrays.fill(largest, (byte) 'x');
        assertEquals(FileReading.LARGEST, read(largest).length());
        byte[] tooLarge = Arrays.copyOf(largest, FileReading.LARGEST + 1);
        UnreadableFile refusal = assertThrows(UnreadableFile.class, () -> read(tooLarge));
        assertEquals("paper.tex is larger than 16 MiB and was not read", refusal.getMessage());
    }

    @Test
    void saysWhatCannotBeRead(@TempDir Path folder) {
        Path missing = folder.resolve("missing.tex");
        assertEquals(
                "there is no file m.tex",
                assertThrows(UnreadableFile.class, () -> FileReading.read(missing, "m.tex"))
                        .getMessage());
        assertEquals(
                "here is a folder",
                assertThrows(UnreadableFile.class, () -> FileReading.read(folder, "here"))
                        .getMessage());
    }

    private static byte[] bytes(String mark, String text, Charset charset) {
        return (mark + text).getBytes(charset);
    }

    private static String read(byte[] bytes) throws UnreadableFile {
        InputStream stream = new ByteArrayInputStream(bytes);
        return FileReading.read(stream, "paper.tex").content();
    }
}
