package org.wellwright.project;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.GeneralCodingRules;

@AnalyzeClasses(packages = "org.wellwright.project", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    @ArchTest
    static final ArchRule jacksonStaysWhereJsonIsReadAndWritten = noClasses()
            .that()
            .resideOutsideOfPackages(
                    "org.wellwright.project.file..",
                    "org.wellwright.project.run..",
                    "org.wellwright.project.command.json..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("tools.jackson..", "com.fasterxml.jackson..");

    @ArchTest
    static final ArchRule theCommandLineLibraryStaysInTheCommand = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.project.command..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.apache.commons.cli..");

    @ArchTest
    static final ArchRule vectorWritersStayInTheReport = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.project.report..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.apache.batik..", "org.apache.pdfbox..", "de.rototor..");

    @ArchTest
    static final ArchRule onlyTheWindowSeesSwingAndTheWindowSystem = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.project.window..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "javax.swing..",
                    "java.awt.event..",
                    "org.openide.windows..",
                    "org.openide.awt..",
                    "org.openide.nodes..",
                    "org.openide.explorer..",
                    "org.openide.filesystems..");

    @ArchTest
    static final ArchRule onlyTheCommandUsesTheStandardStreams = noClasses()
            .that()
            .resideOutsideOfPackage("org.wellwright.project.command..")
            .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS);

    @ArchTest
    static final ArchRule packagesHaveNoCycles =
            slices().matching("org.wellwright.(**)").should().beFreeOfCycles();

    @ArchTest
    static void theScanIsNotEmpty(JavaClasses classes) {
        assertThat(classes.size()).isGreaterThan(40);
    }
}
