package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openide.util.Lookup;

/** Every class that does a service's work is found by whoever looks the service up. */
class RegistrationTest {
    private static final JavaClasses OURS = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("org.wellwright");

    /** A new kind of service gets a line here, with the least number of classes that must do its work. */
    @ParameterizedTest
    @CsvSource({
        "org.wellwright.solver.service.SolverService, 1",
        "org.wellwright.solver.service.FitService, 1",
        "org.wellwright.solver.potential.PotentialFamily, 9",
        "org.wellwright.solver.potential.FormulaLanguage, 1",
        "org.wellwright.project.OpenProjects, 1",
        "org.wellwright.project.FigureWriter, 1",
        "org.wellwright.project.FigureProvider, 6",
    })
    void everyImplementationOfAServiceIsRegistered(String service, int least) throws ClassNotFoundException {
        Set<String> registered = Lookup.getDefault().lookupAll(Class.forName(service)).stream()
                .map(found -> found.getClass().getName())
                .collect(Collectors.toSet());
        Set<String> written = OURS.stream()
                .filter(candidate -> candidate.isAssignableTo(service) && canBeMade(candidate))
                .map(JavaClass::getName)
                .collect(Collectors.toSet());
        assertThat(registered).containsExactlyInAnyOrderElementsOf(written);
        assertThat(registered).hasSizeGreaterThanOrEqualTo(least);
    }

    /** What the Lookup could make: a public class with a constructor that takes nothing. */
    private static boolean canBeMade(JavaClass candidate) {
        return candidate.getModifiers().contains(JavaModifier.PUBLIC)
                && !candidate.getModifiers().contains(JavaModifier.ABSTRACT)
                && !candidate.isInterface()
                && candidate.tryGetConstructor().isPresent();
    }
}
