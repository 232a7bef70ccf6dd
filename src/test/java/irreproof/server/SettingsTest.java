package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import com.google.gson.JsonParser;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What initializationOptions may hold, and what else they hold in practice. */
class SettingsTest {
    private static Settings of(String json) {
        return Settings.of(JsonParser.parseString(json));
    }

    private static void assertComplains(String problem, String json) {
        Settings settings = of(json);
        assertEquals(List.of(problem), settings.problems());
        assertEquals("", settings.group());
        assertNull(settings.positionEncoding());
    }

    @Test
    void bothSettingsAreRead() {
        assertEquals(
                new Settings("SU(5)", PositionEncoding.UTF_8, List.of()),
                of("{group: ' SU(5) ', positionEncoding: 'utf-8', other: 1}"));
    }

    @Test
    void nothingGivenIsNothingSet() {
        Settings empty = new Settings("", null, List.of());
        assertEquals(empty, Settings.of(null));
        assertEquals(empty, of("null"));
        assertEquals(empty, of("{}"));
        assertEquals(empty, of("{group: null, positionEncoding: ''}"));
    }

    @Test
    void whatMakesNoSenseIsAProblemAndIgnored() {
        assertComplains("group should be a text", "{group: 5}");
        assertComplains("\"no group\" is not a group such as SU(5)", "{group: 'no group'}");
        assertComplains(
                "positionEncoding should be utf-8, utf-16 or utf-32, not latin-1", "{positionEncoding: 'latin-1'}");
        assertComplains("initializationOptions should be an object", "[]");
    }

    @Test
    void problemsGoToTheClientsLog() {
        try (Editor editor = Editor.with("{initializationOptions: {group: 5}}")) {
            assertEquals("group should be a text", editor.nextLog().getMessage());
            editor.open("2 \\otimes 2 = 5");
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
        }
    }
}
