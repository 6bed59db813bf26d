package org.seamwatch.schemas;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The contracts stand on their own: nothing of the other modules, and no computation. */
@AnalyzeClasses(packages = "org.seamwatch.schemas", importOptions = ImportOption.DoNotIncludeTests.class)
class LayersTest {

    @ArchTest
    static final ArchRule shouldDependOnNoOtherModule = classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                    "org.seamwatch.schemas..",
                    "java..",
                    "com.fasterxml.jackson..",
                    "org.jspecify..",
                    "org.locationtech.jts..",
                    "org.yaml.snakeyaml..");

    @ArchTest
    static final ArchRule shouldReadFilesForPlansAndGeographiesOnly = noClasses()
            .that()
            .resideOutsideOfPackages("org.seamwatch.schemas.plan..", "org.seamwatch.schemas.geography..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.nio.file..");

    @ArchTest
    static final ArchRule shouldKeepRecordsApartFromPlansAndGeographies = noClasses()
            .that()
            .resideInAPackage("org.seamwatch.schemas.record..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.seamwatch.schemas.plan..", "org.seamwatch.schemas.geography..");
}
