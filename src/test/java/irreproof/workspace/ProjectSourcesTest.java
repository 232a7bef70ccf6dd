package irreproof.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.text.SourceText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A paper in a folder that the mark {@code irreproof.toml} makes a project, and files around it. */
class ProjectSourcesTest {
    @TempDir
    private Path disk;

    private Path paper;
    private OpenDocuments open = OpenDocuments.none();

    @BeforeEach
    void layFiles() throws IOException {
        paper = disk.resolve("paper");
        lay("outside.tex", "outside");
        lay("paper/irreproof.toml", "");
        lay("paper/main.tex", "\\documentclass{article} \\input{macros} \\include{parts/one} % \\input{parts/two}");
        lay("paper/macros.tex", "macros of the root");
        lay("paper/style.sty", "style");
        lay("paper/parts/one.tex", "\\input{local} \\input deeper/three");
        lay("paper/parts/local.tex", "local");
        lay("paper/parts/macros.tex", "macros of the parts");
        lay("paper/parts/two.tex", "nobody includes this");
        lay("paper/parts/deeper/three.tex", "three");
    }

    @Test
    void addsTheEndingAsTexDoes() throws IOException {
        assertEquals("macros of the root", found("main.tex", "main.tex", "macros"));
        assertEquals("macros of the root", found("main.tex", "main.tex", "macros.tex"));
        assertEquals("style", found("main.tex", "main.tex", "style.sty"));
        lay("paper/version1.2.tex", "with a dot");
        assertEquals("with a dot", found("main.tex", "main.tex", "version1.2"));
    }

    @Test
    void looksInTheRootsFolderFirstThenInTheIncludingFiles() {
        assertEquals("local", found("main.tex", "parts/one.tex", "local"));
        assertEquals("macros of the root", found("main.tex", "parts/one.tex", "macros"));
        assertEquals("macros of the root", found("parts/one.tex", "parts/one.tex", "macros"));
    }

    @Test
    void readsNothingOutsideTheProject() {
        assertEquals("", found("main.tex", "main.tex", "../outside"));
        assertEquals(
                "", found("main.tex", "main.tex", disk.resolve("outside.tex").toString()));
        assertEquals("macros of the root", found("parts/two.tex", "parts/two.tex", "../macros"));
    }

    @Test
    void withoutAMarkTheProjectReachesOneFolderUp() throws IOException {
        Files.delete(paper.resolve("irreproof.toml"));
        assertEquals("outside", found("main.tex", "main.tex", "../outside"));
        assertEquals("", found("parts/two.tex", "parts/two.tex", "../../outside"));
    }

    @Test
    void findsTheDocumentThatAChapterBelongsTo() {
        assertEquals(List.of("main.tex"), preambles("parts/one.tex"));
        assertEquals(List.of("main.tex"), preambles("parts/deeper/three.tex"));
        assertEquals(List.of("main.tex"), preambles("macros.tex"));
        assertEquals(List.of(), preambles("main.tex"));
        assertEquals(List.of(), preambles("parts/two.tex"));
    }

    @Test
    void believesAChapterThatNamesItsDocument() throws IOException {
        lay("paper/parts/two.tex", "% !TEX root = ../main.tex\n");
        assertEquals(List.of("main.tex"), preambles("parts/two.tex"));
        lay("paper/parts/two.tex", "\\documentclass[../main]{subfiles}");
        assertEquals(List.of("main.tex"), preambles("parts/two.tex"));
    }

    @Test
    void endsWhereFilesIncludeEachOther() throws IOException {
        lay("paper/main.tex", "\\documentclass{article} \\input{a}");
        lay("paper/a.tex", "\\input{b}");
        lay("paper/b.tex", "\\input{a}");
        assertEquals(List.of("main.tex"), preambles("b.tex"));
        assertEquals(List.of(), preambles("parts/two.tex"));
    }

    @Test
    void unsavedTextWinsOverTheDisk() {
        Path macros = paper.resolve("macros.tex");
        open = open.with(macros, new SourceText(macros.toString(), "unsaved"));
        Path fresh = paper.resolve("fresh.tex");
        open = open.with(fresh, new SourceText(fresh.toString(), "not on disk yet"));
        Path main = paper.resolve("main.tex");
        open = open.with(main, new SourceText(main.toString(), "\\documentclass{article} \\input{parts/two}"));
        assertEquals("unsaved", found("main.tex", "main.tex", "macros"));
        assertEquals("not on disk yet", found("main.tex", "main.tex", "fresh"));
        assertEquals(List.of("main.tex"), preambles("parts/two.tex"));
        open = open.without(macros);
        assertEquals("macros of the root", found("main.tex", "main.tex", "macros"));
    }

    @Test
    void seesThatAFileHasChanged() throws IOException {
        FileCache cache = new FileCache();
        SourceText document = new SourceText(paper.resolve("main.tex").toString(), "");
        ProjectSources sources = new ProjectSources(document, open, cache);
        assertEquals(
                "style",
                sources.find(document.path(), "style.sty").orElseThrow().content());
        lay("paper/style.sty", "a longer style");
        assertEquals(
                "a longer style",
                sources.find(document.path(), "style.sty").orElseThrow().content());
    }

    @Test
    void aTextWithoutAFileBelongsInTheCurrentFolder() {
        ProjectSources sources = new ProjectSources(new SourceText("-", "x"), open, new FileCache());
        assertEquals("pom.xml", sources.find("-", "pom.xml").orElseThrow().path());
        assertEquals(Optional.empty(), sources.find("-", "no\0name"));
    }

    private void lay(String name, String content) throws IOException {
        Path file = disk.resolve(name);
        Files.createDirectories(file.getParent());
        Files.writeString(file, content);
    }

    private ProjectSources sources(String document) {
        Path file = paper.resolve(document);
        try {
            return new ProjectSources(new SourceText(file.toString(), Files.readString(file)), open, new FileCache());
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    private String found(String document, String from, String name) {
        return sources(document)
                .find(paper.resolve(from).toString(), name)
                .map(SourceText::content)
                .orElse("");
    }

    private List<String> preambles(String document) {
        return sources(document).preambles(paper.resolve(document).toString()).stream()
                .map(text -> paper.relativize(Path.of(text.path())).toString())
                .toList();
    }
}
