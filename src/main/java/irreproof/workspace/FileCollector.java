package irreproof.workspace;

import java.io.File;
import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * Finds the files to check. A file that is named is taken whatever its ending; below a folder those ending in
 * {@code .tex}, {@code .ltx} or {@code .latex} are. Hidden folders and links to folders below are left out. Each file
 * comes once, in the order of the shown paths.
 */
public final class FileCollector {
    private static final List<String> ENDINGS = List.of(".tex", ".ltx", ".latex");

    private final List<SourceFile> found = new ArrayList<>();

    private FileCollector() {}

    /** @throws UnreadableFile if a path leads nowhere, or a folder holds no LaTeX file or cannot be listed */
    public static List<SourceFile> collect(List<String> paths) throws UnreadableFile {
        FileCollector collector = new FileCollector();
        for (String path : paths) {
            collector.add(path);
        }
        collector.found.sort(Comparator.comparing(SourceFile::shown));
        Set<Path> seen = new HashSet<>();
        return collector.found.stream()
                .filter(source -> seen.add(identity(source.file())))
                .toList();
    }

    private void add(String path) throws UnreadableFile {
        Path start = Path.of(path);
        if (!Files.exists(start)) {
            throw new UnreadableFile("there is no file or folder " + path);
        }
        if (!Files.isDirectory(start)) {
            found.add(new SourceFile(start, path));
            return;
        }
        int before = found.size();
        try {
            Files.walkFileTree(start, new SimpleFileVisitor<>() {
                @Override
                public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes) {
                    boolean hidden = folder.getFileName() != null
                            && folder.getFileName().toString().startsWith(".");
                    return hidden && !folder.equals(start) ? FileVisitResult.SKIP_SUBTREE : FileVisitResult.CONTINUE;
                }

                @Override
                public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
                    String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
                    if (ENDINGS.stream().anyMatch(name::endsWith) && Files.isRegularFile(file)) {
                        found.add(new SourceFile(file, shown(path, start.relativize(file))));
                    }
                    return FileVisitResult.CONTINUE;
                }
            });
        } catch (IOException e) {
            throw new UnreadableFile("the folder " + path + " cannot be listed: " + e.getMessage());
        }
        if (found.size() == before) {
            throw new UnreadableFile("there is no .tex, .ltx or .latex file in " + path);
        }
    }

    private static String shown(String folder, Path below) {
        String rest = below.toString().replace(File.separatorChar, '/');
        if (folder.equals(".") || folder.isEmpty()) {
            return rest;
        }
        return folder.endsWith("/") || folder.endsWith(File.separator) ? folder + rest : folder + "/" + rest;
    }

    private static Path identity(Path file) {
        try {
            return file.toRealPath();
        } catch (IOException e) {
            return file.toAbsolutePath().normalize();
        }
    }
}
