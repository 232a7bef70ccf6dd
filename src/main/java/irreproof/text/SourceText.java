package irreproof.text;

/** One original text under the path the user knows it by ({@code -} for standard input), with its lines. */
public record SourceText(String path, String content, LineIndex lines) {
    public SourceText(String path, String content) {
        this(path, content, new LineIndex(content));
    }
}
