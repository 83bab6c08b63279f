package org.wellwright.solver.radial.steps;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** A confirmation is worth something only if the two methods share no code. */
@AnalyzeClasses(packages = "org.wellwright.solver", importOptions = ImportOption.DoNotIncludeTests.class)
class IndependenceTest {
    @ArchTest
    static final ArchRule theSecondMethodKnowsTheInterfacesAlone = classes()
            .that()
            .resideInAPackage("org.wellwright.solver.radial.steps")
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                    "java..",
                    "org.wellwright.solver",
                    "org.wellwright.solver.potential",
                    "org.wellwright.solver.radial",
                    "org.wellwright.solver.radial.steps");

    @ArchTest
    static final ArchRule theFirstMethodDoesNotKnowTheSecond = noClasses()
            .that()
            .resideInAnyPackage("org.wellwright.solver.radial.spectral..", "org.wellwright.solver.numerics..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.wellwright.solver.radial.steps");
}
