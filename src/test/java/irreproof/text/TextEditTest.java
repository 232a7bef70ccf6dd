package irreproof.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Edits refer to the text before all of them. */
final class TextEditTest {
    @Test
    void appliedInAnyOrder() {
        List<TextEdit> edits = List.of(new TextEdit(new Span(3, 4), "D"), new TextEdit(new Span(0, 0), ">"));
        assertEquals(">abcD", TextEdit.apply("abcd", edits));
    }

    @Test
    void overlapIsRefused() {
        List<TextEdit> edits = List.of(new TextEdit(new Span(0, 2), "x"), new TextEdit(new Span(1, 3), "y"));
        assertThrows(IllegalArgumentException.class, () -> TextEdit.apply("abcd", edits));
    }
}
