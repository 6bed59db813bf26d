package org.seamwatch.ops;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The edges compute no statistics; made-up data is for the demo and the scenario only. */
@AnalyzeClasses(packages = "org.seamwatch", importOptions = ImportOption.DoNotIncludeTests.class)
class LayersTest {

    @ArchTest
    static final ArchRule shouldComputeNoStatistics = noClasses()
            .that()
            .resideInAPackage("org.seamwatch.ops..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.seamwatch.processors.learning..",
                    "org.seamwatch.processors.distributions..",
                    "org.seamwatch.processors.series..");

    @ArchTest
    static final ArchRule shouldUseMadeUpDataForDemoAndScenarioOnly = noClasses()
            .that()
            .resideInAPackage("org.seamwatch.ops..")
            .and()
            .haveSimpleNameNotStartingWith("Demo")
            .and()
            .haveSimpleNameNotStartingWith("Planted")
            .and()
            .haveSimpleNameNotStartingWith("Scenario")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.seamwatch.fixtures..");

    @ArchTest
    static final ArchRule shouldKeepFixturesFromTheOtherModules = noClasses()
            .that()
            .resideInAPackage("org.seamwatch.fixtures..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.seamwatch.processors..", "org.seamwatch.topology..", "org.seamwatch.ops..");

    @ArchTest
    static final ArchRule shouldPointDownOnly = noClasses()
            .that()
            .resideInAnyPackage("org.seamwatch.schemas..", "org.seamwatch.processors..", "org.seamwatch.topology..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.seamwatch.ops..", "org.seamwatch.fixtures..");
}
