package irreproof.architecture;

import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Predicate;
import org.junit.jupiter.api.Test;

/** Who may use whom: the layers of the code map in DEVELOPERS.md. */
class LayersTest {
    private static final Map<String, Set<String>> MAY_USE = Map.ofEntries(
            Map.entry("text", Set.of()),
            Map.entry("budget", Set.of()),
            Map.entry("latex", Set.of("text", "budget")),
            Map.entry("notation", Set.of("latex", "text", "budget")),
            Map.entry("engine", Set.of("budget")),
            Map.entry("naming", Set.of("engine", "notation", "budget")),
            Map.entry("check", Set.of("text", "budget", "latex", "notation", "engine", "naming")),
            Map.entry("report", Set.of("check", "naming", "notation", "text")),
            Map.entry("workspace", Set.of("check", "latex", "text", "budget")),
            Map.entry("server", Set.of("workspace", "check", "naming", "notation", "text", "budget")),
            Map.entry(
                    "cli",
                    Set.of(
                            "text",
                            "budget",
                            "latex",
                            "notation",
                            "engine",
                            "naming",
                            "check",
                            "report",
                            "workspace",
                            "server")));

    /** Libraries that only the named layers know. */
    private static final Map<String, Set<String>> LIBRARY_USERS = Map.of(
            "org.eclipse.lsp4j", Set.of("server"),
            "org.antlr", Set.of("notation"),
            "com.google.gson", Set.of("report", "server"),
            "picocli", Set.of("cli"));

    @Test
    void everyClassLiesInALayer() {
        Set<String> found = new TreeSet<>();
        ProgramClasses.ALL.forEach(type -> found.add(ProgramClasses.layer(type)));
        assertEquals(new TreeSet<>(MAY_USE.keySet()), found);
    }

    @Test
    void everyLayerUsesOnlyTheLayersItMay() {
        assertNone(dependency -> {
            String from = ProgramClasses.layer(dependency.getOriginClass());
            String to = ProgramClasses.layer(dependency.getTargetClass());
            return !to.isEmpty() && !to.equals(from) && !MAY_USE.get(from).contains(to);
        });
    }

    @Test
    void everyLibraryHasItsOwnUsers() {
        assertNone(dependency -> LIBRARY_USERS.entrySet().stream().anyMatch(library -> {
            String target = dependency.getTargetClass().getBaseComponentType().getPackageName();
            return (target.equals(library.getKey()) || target.startsWith(library.getKey() + "."))
                    && !library.getValue().contains(ProgramClasses.layer(dependency.getOriginClass()));
        }));
    }

    @Test
    void noTwoPackagesUseEachOther() {
        slices().matching("irreproof.(**)").should().beFreeOfCycles().check(ProgramClasses.ALL);
    }

    @Test
    void onlyTheCommandLinePrintsAndExits() {
        List<String> found = ProgramClasses.ALL.stream()
                .filter(type -> !ProgramClasses.layer(type).equals("cli"))
                .flatMap(type -> type.getAccessesFromSelf().stream())
                .filter(access -> {
                    JavaClass owner = access.getTargetOwner();
                    String name = access.getTarget().getName();
                    return owner.isEquivalentTo(System.class)
                                    && Set.of("in", "out", "err", "exit").contains(name)
                            || owner.isEquivalentTo(Runtime.class)
                                    && Set.of("exit", "halt").contains(name)
                            || owner.isAssignableTo(Throwable.class) && name.equals("printStackTrace");
                })
                .map(Object::toString)
                .toList();
        assertEquals(List.of(), found);
    }

    private static void assertNone(Predicate<Dependency> forbidden) {
        assertTrue(ProgramClasses.ALL.size() > 10, "no classes were read");
        List<String> found = ProgramClasses.ALL.stream()
                .flatMap(type -> type.getDirectDependenciesFromSelf().stream())
                .filter(forbidden)
                .map(Dependency::getDescription)
                .toList();
        assertEquals(List.of(), found);
    }
}
