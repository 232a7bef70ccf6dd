package irreproof.architecture;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;

/** The compiled classes of the program, tests left out, read once. */
final class ProgramClasses {
    static final JavaClasses ALL = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("irreproof");

    private ProgramClasses() {}

    /** The first part of the package below {@code irreproof}; empty for a class of anyone else. */
    static String layer(JavaClass type) {
        String[] parts = type.getBaseComponentType().getPackageName().split("\\.");
        return parts.length >= 2 && parts[0].equals("irreproof") ? parts[1] : "";
    }
}
