package org.wellwright.branding;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

@AnalyzeClasses(packages = "org.wellwright", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    @ArchTest
    static final ArchRule theLookKnowsNoOtherModule = noClasses()
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.wellwright.solver..",
                    "org.wellwright.project..",
                    "org.wellwright.editor..",
                    "org.wellwright.viewer..")
            .because("editor and viewer share the look without seeing each other");

    @ArchTest
    static final ArchRule coloursKnowNoWindow = noClasses()
            .that()
            .haveSimpleName("OkLab")
            .or()
            .haveSimpleName("ColourScale")
            .or()
            .haveSimpleName("Mark")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javax.swing..", "org.openide..", "org.jfree..")
            .because("reports use them where there is no window");

    @ArchTest
    static void theScanIsNotEmpty(JavaClasses classes) {
        assertThat(classes.size()).isGreaterThan(6);
    }
}
