package org.seamwatch.topology;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The wiring knows the steps and the engine, and computes no statistics. */
@AnalyzeClasses(packages = "org.seamwatch.topology", importOptions = ImportOption.DoNotIncludeTests.class)
class LayersTest {

    @ArchTest
    static final ArchRule shouldDependOnTheStepsAndTheEngineOnly = classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                    "org.seamwatch.topology..",
                    "org.seamwatch.processors..",
                    "org.seamwatch.schemas..",
                    "java..",
                    "com.fasterxml.jackson.core..",
                    "org.apache.kafka..",
                    "org.rocksdb..",
                    "org.jspecify..",
                    "org.slf4j..");

    @ArchTest
    static final ArchRule shouldComputeNoStatistics = noClasses()
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.seamwatch.processors.spatial..",
                    "org.seamwatch.processors.charts..",
                    "org.seamwatch.processors.learning..",
                    "org.seamwatch.processors.distributions..",
                    "org.seamwatch.processors.statistics..");

    @ArchTest
    static final ArchRule shouldReplayWithoutTheEngine = noClasses()
            .that()
            .resideInAPackage("org.seamwatch.topology.replay..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.apache.kafka.streams..", "org.seamwatch.topology.service..");
}
