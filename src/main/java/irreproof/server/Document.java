package irreproof.server;

import irreproof.text.SourceText;
import java.net.URI;
import java.nio.file.FileSystemNotFoundException;
import java.nio.file.Path;
import java.util.Optional;

/**
 * An open document as it stood at one version; immutable.
 *
 * @param uri as the client writes it
 * @param file its file, saved or not; empty for what is no file, such as an unnamed buffer
 * @param source under the path of the file, else under the URI
 */
record Document(String uri, int version, Optional<Path> file, SourceText source) {

    static Document of(String uri, int version, String text) {
        Optional<Path> file = fileOf(uri);
        return new Document(
                uri, version, file, new SourceText(file.map(Path::toString).orElse(uri), text));
    }

    Document changed(int newVersion, String newText) {
        return new Document(uri, newVersion, file, new SourceText(source.path(), newText));
    }

    Places places(PositionEncoding encoding) {
        return new Places(source.content(), source.lines(), encoding);
    }

    private static Optional<Path> fileOf(String uri) {
        try {
            URI parsed = URI.create(uri);
            return "file".equals(parsed.getScheme())
                    ? Optional.of(Path.of(parsed).normalize())
                    : Optional.empty();
        } catch (IllegalArgumentException | FileSystemNotFoundException e) {
            return Optional.empty();
        }
    }
}
