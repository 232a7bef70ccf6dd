package irreproof.latex;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * The commands and environments a document defines. While the document is read, definitions come and go with the groups
 * they stand in; afterwards the table holds what was in force at the end and no longer changes.
 */
public final class MacroTable {
    /** What {@code \begin} and {@code \end} of an environment stand for; the end may use the begin's arguments. */
    record Environment(Macro begin, Macro end) {}

    /** What to restore when the group ends; a null meaning for a name that was not defined. */
    private record Undo(String name, Macro meaning) {}

    private final Map<String, Macro> macros = new HashMap<>();
    private final Map<String, Environment> environments = new HashMap<>();
    private final Map<String, Boolean> switches = new HashMap<>();
    private final List<Undo> undos = new ArrayList<>();
    private int[] groupStarts = new int[16];
    private int groups;

    MacroTable() {}

    /** The meaning of a command, named without its backslash, at the document's end. */
    public Optional<Macro> macro(String name) {
        return Optional.ofNullable(macros.get(name));
    }

    /** The names of all defined commands, sorted. */
    public Set<String> names() {
        return Collections.unmodifiableSet(new TreeSet<>(macros.keySet()));
    }

    /** The meaning at this point of the reading, or null. */
    Macro find(String name) {
        return macros.get(name);
    }

    void define(String name, Macro macro) {
        if (groups > 0) {
            undos.add(new Undo(name, macros.get(name)));
        }
        macros.put(name, macro);
    }

    void defineGlobally(String name, Macro macro) {
        if (!undos.isEmpty()) {
            undos.removeIf(undo -> undo.name().equals(name));
        }
        macros.put(name, macro);
    }

    void defineEnvironment(String name, Environment environment) {
        environments.put(name, environment);
    }

    Environment environment(String name) {
        return environments.get(name);
    }

    /** A {@code \newif} switch, named without its {@code if}. */
    void setSwitch(String name, boolean value) {
        switches.put(name, value);
    }

    /** The switch's state, or null if there is no such switch. */
    Boolean switchState(String name) {
        return switches.get(name);
    }

    void openGroup() {
        if (groups == groupStarts.length) {
            groupStarts = Arrays.copyOf(groupStarts, 2 * groups);
        }
        groupStarts[groups++] = undos.size();
    }

    /** Ends the innermost group; nothing happens outside all groups. */
    void closeGroup() {
        if (groups == 0) {
            return;
        }
        int start = groupStarts[--groups];
        for (int i = undos.size() - 1; i >= start; i--) {
            Undo undo = undos.remove(i);
            if (undo.meaning() == null) {
                macros.remove(undo.name());
            } else {
                macros.put(undo.name(), undo.meaning());
            }
        }
    }

    int openGroups() {
        return groups;
    }
}
