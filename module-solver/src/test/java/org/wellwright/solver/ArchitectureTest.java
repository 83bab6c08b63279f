package org.wellwright.solver;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.assignableTo;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

@AnalyzeClasses(packages = "org.wellwright", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    @ArchTest
    static final ArchRule physicsKnowsNoDesktopAndNoFiles = noClasses()
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "java.awt..", "javax.swing..", "java.nio.file..", "org.openide.windows..", "org.netbeans..")
            .orShould()
            .dependOnClassesThat()
            .haveFullyQualifiedName("java.io.File")
            .because("the solver must run headless and be testable without a platform");

    @ArchTest
    static final ArchRule ofThePlatformOnlyTheLookupIsKnown = noClasses()
            .should()
            .dependOnClassesThat(resideInAPackage("org.openide..")
                    .and(not(resideInAPackage("org.openide.util.lookup")))
                    .and(not(assignableTo("org.openide.util.Lookup"))));

    @ArchTest
    static final ArchRule numericsKnowsOnlyTheJdkAndCommonsMath = classes()
            .that()
            .resideInAPackage("org.wellwright.solver.numerics..")
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage("java..", "org.apache.commons..", "org.wellwright.solver.numerics..")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule potentialsDoNotKnowWhatEvaluatesThem = noClasses()
            .that()
            .resideInAPackage("org.wellwright.solver.potential")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.wellwright.solver.potential.*..");

    @ArchTest
    static final ArchRule potentialsDoNotKnowTheSolver = noClasses()
            .that()
            .resideInAPackage("org.wellwright.solver.potential..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.wellwright.solver.radial..",
                    "org.wellwright.solver.model..",
                    "org.wellwright.solver.fit..",
                    "org.wellwright.solver.service..");

    @ArchTest
    static final ArchRule theSolverIsUnitBlind = noClasses()
            .that()
            .resideInAnyPackage("org.wellwright.solver.radial..", "org.wellwright.solver.numerics..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.wellwright.solver.model..", "org.wellwright.solver.pair..", "org.wellwright.solver.service..")
            .because("units are converted in one place, before the problem reaches the solver");

    @ArchTest
    static final ArchRule implementationsAreFoundByLookupOnly = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.solver.service.internal..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.wellwright.solver.service.internal..");

    @ArchTest
    static final ArchRule packagesHaveNoCycles =
            slices().matching("org.wellwright.(**)").should().beFreeOfCycles();

    @ArchTest
    static void theScanIsNotEmpty(JavaClasses classes) {
        assertThat(classes.size()).isGreaterThan(150);
    }
}
