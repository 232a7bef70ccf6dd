package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.text.LineIndex;
import irreproof.text.Span;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Incremental changes give the text that the editor has. */
class ContentChangesTest {
    private static final long SEED = 20261201;
    private static final String[] PIECES = {"", "a", "é", "—", "𝔰", "\n", "\r\n", "\r", "x\ny", "long piece 𝟛\n"};

    /** Each step is also done on the text itself, with an index built afresh. */
    @ParameterizedTest
    @EnumSource(PositionEncoding.class)
    void randomChangesAgreeWithEditsOfTheText(PositionEncoding encoding) {
        Random random = new Random(SEED);
        for (int round = 0; round < 200; round++) {
            String start = piece(random) + piece(random) + piece(random);
            String text = start;
            List<TextDocumentContentChangeEvent> changes = new ArrayList<>();
            for (int step = random.nextInt(12); step >= 0; step--) {
                String inserted = piece(random) + piece(random);
                if (random.nextInt(20) == 0) {
                    changes.add(new TextDocumentContentChangeEvent(inserted));
                    text = inserted;
                    continue;
                }
                Places places = new Places(text, new LineIndex(text), encoding);
                int from = random.nextInt(text.length() + 1);
                int to = from + random.nextInt(text.length() - from + 1);
                Range range = places.range(new Span(from, to));
                Span exact = places.span(range);
                changes.add(new TextDocumentContentChangeEvent(range, inserted));
                text = text.substring(0, exact.start()) + inserted + text.substring(exact.end());
            }
            assertEquals(text, ContentChanges.apply(start, changes, encoding), "seed " + SEED + ", round " + round);
        }
    }

    private static String piece(Random random) {
        return PIECES[random.nextInt(PIECES.length)];
    }

    @Test
    void replacingEverywhereInALongTextIsNotQuadratic() {
        int lines = 40_000;
        String text = "some words and \\mathbf{10} in a line of usual length\n".repeat(lines);
        List<TextDocumentContentChangeEvent> changes = new ArrayList<>();
        for (int line = lines - 1; line >= 0; line--) {
            changes.add(new TextDocumentContentChangeEvent(
                    new Range(new Position(line, 0), new Position(line, 4)), "SOME"));
        }
        String changed = Assertions.assertTimeoutPreemptively(
                Duration.ofSeconds(60), () -> ContentChanges.apply(text, changes, PositionEncoding.UTF_16));
        assertEquals(text.replace("some", "SOME"), changed);
    }
}
