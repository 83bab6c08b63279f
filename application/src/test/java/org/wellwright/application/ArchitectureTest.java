package org.wellwright.application;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import com.tngtech.archunit.library.GeneralCodingRules;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URL;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.stream.Collectors;

/** What holds across the modules; what holds inside one stands in its own test of this name. */
@AnalyzeClasses(packages = "org.wellwright", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    private static final String ROOT = "org.wellwright.";

    /** Which packages a module exports, by the module's name, as its manifest tells the platform. */
    private static final Map<String, Set<String>> EXPORTED = exported();

    @ArchTest
    static final ArchRule aModuleUsesWhatTheOtherExports = classes()
            .should(new ArchCondition<>("use exported packages of other modules only") {
                @Override
                public void check(JavaClass user, ConditionEvents events) {
                    for (Dependency dependency : user.getDirectDependenciesFromSelf()) {
                        String target = dependency.getTargetClass().getPackageName();
                        if (target.startsWith(ROOT) && !module(target).equals(module(user.getPackageName()))) {
                            boolean open = EXPORTED.getOrDefault(module(target), Set.of())
                                    .contains(target);
                            events.add(new SimpleConditionEvent(user, open, dependency.getDescription()));
                        }
                    }
                }
            });

    @ArchTest
    static final ArchRule theSolverKnowsNobody = noClasses()
            .that()
            .resideInAPackage("org.wellwright.solver..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.wellwright.project..",
                    "org.wellwright.branding..",
                    "org.wellwright.editor..",
                    "org.wellwright.viewer..");

    @ArchTest
    static final ArchRule theProjectKnowsOnlyTheSolver = noClasses()
            .that()
            .resideInAPackage("org.wellwright.project..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.wellwright.branding..", "org.wellwright.editor..", "org.wellwright.viewer..");

    @ArchTest
    static final ArchRule chartsAreDrawnByTheLookEditorAndViewer = noClasses()
            .that()
            .resideInAnyPackage("org.wellwright.solver..", "org.wellwright.project..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.jfree..");

    @ArchTest
    static final ArchRule noExceptionSaysNothing = GeneralCodingRules.NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS;

    @ArchTest
    static final ArchRule onlyTheCommandUsesTheStandardStreams = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.project.command..")
            .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS);

    @ArchTest
    static final ArchRule namesSayWhatAThingIs =
            noClasses().should().haveNameMatching(".*(Impl|Utils?|Manager|Helper)(\\$.*)?");

    @ArchTest
    static final ArchRule modulesHaveNoCycles =
            slices().matching("org.wellwright.(*)..").should().beFreeOfCycles();

    @ArchTest
    static void everyModuleIsScanned(JavaClasses classes) {
        Set<String> modules =
                classes.stream().map(found -> module(found.getPackageName())).collect(Collectors.toSet());
        assertThat(modules).contains("branding", "solver", "project", "editor", "viewer");
        assertThat(EXPORTED.keySet()).contains("branding", "solver", "project", "editor", "viewer");
        assertThat(classes.size()).isGreaterThan(200);
    }

    private static String module(String packageName) {
        String rest = packageName.substring(ROOT.length());
        int dot = rest.indexOf('.');
        return dot < 0 ? rest : rest.substring(0, dot);
    }

    private static Map<String, Set<String>> exported() {
        Map<String, Set<String>> packages = new HashMap<>();
        try {
            for (URL url :
                    Collections.list(ArchitectureTest.class.getClassLoader().getResources("META-INF/MANIFEST.MF"))) {
                try (var stream = url.openStream()) {
                    Attributes main = new Manifest(stream).getMainAttributes();
                    String name =
                            Optional.ofNullable(main.getValue("OpenIDE-Module")).orElse("");
                    if (name.startsWith(ROOT)) {
                        packages.put(module(name), packages(main.getValue("OpenIDE-Module-Public-Packages")));
                    }
                }
            }
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
        return packages;
    }

    /** The value is a list such as {@code a.b.*, c.d.*}, or {@code -} for none. */
    private static Set<String> packages(String value) {
        return Arrays.stream(value.split("[,\\s]+"))
                .filter(entry -> entry.endsWith(".*"))
                .map(entry -> entry.substring(0, entry.length() - 2))
                .collect(Collectors.toSet());
    }
}
