package irreproof.server;

import irreproof.text.SourceText;
import java.net.URI;
import java.nio.file.Path;

/**
 * An open document as it stood at one version; immutable.
 *
 * @param uri as the client writes it
 */
record Document(String uri, int version, SourceText source) {

    static Document of(String uri, int version, String text) {
        return new Document(uri, version, new SourceText(pathOf(uri), text));
    }

    Places places(PositionEncoding encoding) {
        return new Places(source.content(), source.lines(), encoding);
    }

    /** The path of a file; for what is not a file (an unnamed buffer) the URI itself. */
    static String pathOf(String uri) {
        try {
            URI parsed = URI.create(uri);
            return "file".equals(parsed.getScheme()) ? Path.of(parsed).toString() : uri;
        } catch (IllegalArgumentException e) {
            return uri;
        }
    }
}
