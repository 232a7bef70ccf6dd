package irreproof.server;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import irreproof.check.Checker;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What the user may set in {@code initializationOptions}.
 *
 * @param group a group for statements whose document names none, as in {@code check --group}; or empty
 * @param positionEncoding the units the client really counts in, for clients that cannot negotiate; or null
 * @param problems what could not be understood, for the client's log
 */
record Settings(String group, PositionEncoding positionEncoding, List<String> problems) {
    Settings {
        problems = List.copyOf(problems);
    }

    static Settings of(Object initializationOptions) {
        List<String> problems = new ArrayList<>();
        if (!(initializationOptions instanceof JsonObject options)) {
            if (initializationOptions instanceof JsonElement other && !other.isJsonNull()) {
                problems.add("initializationOptions should be an object");
            }
            return new Settings("", null, problems);
        }
        String typed = text(options, "group", problems);
        Optional<String> problem = Checker.problemWithGroup(typed);
        problem.ifPresent(problems::add);
        String group = problem.isPresent() ? "" : typed;
        String word = text(options, "positionEncoding", problems);
        PositionEncoding encoding = PositionEncoding.named(word).orElse(null);
        if (encoding == null && !word.isEmpty()) {
            problems.add("positionEncoding should be utf-8, utf-16 or utf-32, not " + word);
        }
        return new Settings(group, encoding, problems);
    }

    private static String text(JsonObject options, String name, List<String> problems) {
        JsonElement value = options.get(name);
        if (value == null || value.isJsonNull()) {
            return "";
        }
        if (value instanceof JsonPrimitive primitive && primitive.isString()) {
            return primitive.getAsString().strip();
        }
        problems.add(name + " should be a text");
        return "";
    }
}
