package irreproof.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaCodeUnit;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** The engine computes exactly and touches nothing outside itself. */
class ExactEngineTest {
    private static final List<String> OUTSIDE = List.of(
            "java.io.",
            "java.nio.",
            "java.time.",
            "java.net.",
            "java.util.logging.",
            "java.util.Random",
            "java.util.Date",
            "java.util.Timer");
    private static final Set<String> INEXACT = Set.of(
            "double",
            "float",
            "java.lang.Double",
            "java.lang.Float",
            "java.util.OptionalDouble",
            "java.util.stream.DoubleStream");
    private static final Pattern INEXACT_WORD = Pattern.compile("\\b(double|float)\\b");

    @Test
    void theEngineTouchesNoFilesAndNoClock() {
        List<String> found = new ArrayList<>();
        for (JavaClass type : engine()) {
            type.getDirectDependenciesFromSelf().stream()
                    .filter(use -> OUTSIDE.stream()
                            .anyMatch(
                                    use.getTargetClass().getBaseComponentType().getName()::startsWith))
                    .forEach(use -> found.add(use.getDescription()));
            type.getMethodCallsFromSelf().stream()
                    .filter(call -> call.getTargetOwner().isEquivalentTo(System.class)
                            && call.getName().matches("nanoTime|currentTimeMillis|getenv|getProperty"))
                    .forEach(call -> found.add(call.getDescription()));
        }
        assertEquals(List.of(), found);
    }

    @Test
    void theEngineHasNoFloatingPointFieldsMethodsOrCalls() {
        List<String> found = new ArrayList<>();
        for (JavaClass type : engine()) {
            type.getFields().stream()
                    .filter(field -> isInexact(field.getRawType()))
                    .forEach(field -> found.add(field.getFullName()));
            type.getCodeUnits().stream()
                    .filter(unit -> !(type.isAnonymousClass() && unit.isConstructor()))
                    .filter(ExactEngineTest::isInexact)
                    .forEach(unit -> found.add(unit.getFullName()));
            type.getCodeUnitCallsFromSelf().stream()
                    .filter(call -> !takesALoadFactor(call.getTargetOwner()))
                    .filter(call -> isInexact(call.getTarget().getRawReturnType())
                            || call.getTarget().getRawParameterTypes().stream().anyMatch(ExactEngineTest::isInexact))
                    .forEach(call -> found.add(call.getDescription()));
        }
        assertEquals(List.of(), found);
    }

    /** Bytecode does not show the types of local variables, so look at the words of the sources too. */
    @Test
    void theEngineHasNoFloatingPointVariables() {
        List<String> found = new ArrayList<>();
        for (String path : SourceTree.files()) {
            if (path.startsWith("src/main/java/irreproof/engine/")) {
                String code = SourceTree.read(path).replaceAll("(?s)/\\*.*?\\*/|//[^\n]*|\"[^\"\n]*\"", "");
                if (INEXACT_WORD.matcher(code).find()) {
                    found.add(path);
                }
            }
        }
        assertEquals(List.of(), found);
    }

    private static List<JavaClass> engine() {
        List<JavaClass> classes = ProgramClasses.ALL.stream()
                .filter(type -> ProgramClasses.layer(type).equals("engine"))
                .toList();
        assertFalse(classes.isEmpty(), "no engine classes were read");
        return classes;
    }

    /** The load factor of a hash table computes nothing; an anonymous subclass passes it on. */
    private static boolean takesALoadFactor(JavaClass owner) {
        return owner.isAssignableTo(HashMap.class)
                && (owner.isEquivalentTo(LinkedHashMap.class) || owner.isAnonymousClass());
    }

    private static boolean isInexact(JavaCodeUnit unit) {
        return isInexact(unit.getRawReturnType())
                || unit.getRawParameterTypes().stream().anyMatch(ExactEngineTest::isInexact);
    }

    private static boolean isInexact(JavaClass type) {
        return INEXACT.contains(type.getBaseComponentType().getName());
    }
}
