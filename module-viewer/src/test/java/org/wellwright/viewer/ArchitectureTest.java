package org.wellwright.viewer;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

@AnalyzeClasses(packages = "org.wellwright.viewer", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    @ArchTest
    static final ArchRule theViewerDoesNotKnowTheEditor =
            noClasses().should().dependOnClassesThat().resideInAPackage("org.wellwright.editor..");

    @ArchTest
    static final ArchRule statesAndControllersAreFreeOfSwing = noClasses()
            .that()
            .haveSimpleNameEndingWith("ViewModel")
            .or()
            .haveSimpleNameEndingWith("Controller")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javax.swing..", "java.awt.event..", "org.openide.windows..")
            .allowEmptyShould(true)
            .because("they are tested without a window");

    @ArchTest
    static final ArchRule packagesHaveNoCycles =
            slices().matching("org.wellwright.(**)").should().beFreeOfCycles();

    @ArchTest
    static void theScanIsNotEmpty(JavaClasses classes) {
        assertThat(classes.size()).isGreaterThan(0);
    }
}
