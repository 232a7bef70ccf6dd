package irreproof.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileCollectorTest {
    @TempDir
    private Path folder;

    @BeforeEach
    void layFiles() throws IOException {
        for (String name : List.of(
                "b.tex", "a.tex", "notes.txt", "part/c.LTX", "part/d.latex", "part/deep/e.tex", ".hidden/f.tex")) {
            Path file = folder.resolve(name);
            Files.createDirectories(file.getParent());
            Files.writeString(file, "");
        }
    }

    @Test
    void takesLatexFilesBelowAFolderInOrder() throws UnreadableFile {
        assertEquals(
                List.of("a.tex", "b.tex", "part/c.LTX", "part/d.latex", "part/deep/e.tex"), below(folder.toString()));
        assertEquals(List.of("a.tex", "b.tex", "part/c.LTX", "part/d.latex", "part/deep/e.tex"), below(folder + "/"));
    }

    @Test
    void takesANamedFileWhateverItsEnding() throws UnreadableFile {
        assertEquals(List.of("notes.txt"), below(folder.resolve("notes.txt").toString()));
    }

    @Test
    void takesAHiddenFolderThatIsNamed() throws UnreadableFile {
        assertEquals(List.of(".hidden/f.tex"), below(folder.resolve(".hidden").toString()));
    }

    @Test
    void takesEachFileOnceInOneOrder() throws UnreadableFile {
        String part = folder.resolve("part").toString();
        String file = folder.resolve("part/d.latex").toString();
        assertEquals(List.of("part/c.LTX", "part/d.latex", "part/deep/e.tex"), below(file, part, part));
        assertEquals(below(folder.toString(), file), below(file, folder.toString()));
    }

    @Test
    void saysWhatIsNotThere() throws IOException {
        String missing = folder.resolve("missing").toString();
        assertEquals("there is no file or folder " + missing, refusal(missing));
        String empty = Files.createDirectory(folder.resolve("empty")).toString();
        assertEquals("there is no .tex, .ltx or .latex file in " + empty, refusal(empty));
    }

    private static String refusal(String path) {
        return assertThrows(UnreadableFile.class, () -> FileCollector.collect(List.of(path)))
                .getMessage();
    }

    /** The shown paths without the temporary folder, which they must begin with. */
    private List<String> below(String... paths) throws UnreadableFile {
        String start = folder + "/";
        return FileCollector.collect(List.of(paths)).stream()
                .map(source -> {
                    assertEquals(start, source.shown().substring(0, start.length()));
                    return source.shown().substring(start.length());
                })
                .toList();
    }
}
