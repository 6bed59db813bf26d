package org.seamwatch.processors;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.methods;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;

/** A test that the build does not find, or that does not say what it shows, is none. */
@AnalyzeClasses(packages = "org.seamwatch.processors", importOptions = ImportOption.OnlyIncludeTests.class)
class TestNamesTest {

    @ArchTest
    static final ArchRule shouldFindEveryClassWithTests = classes()
            .that(DescribedPredicate.describe("have tests", TestNamesTest::hasTests))
            .should()
            .haveSimpleNameEndingWith("Test");

    @ArchTest
    static final ArchRule shouldSayWhatATestShows = methods()
            .that()
            .areAnnotatedWith(Test.class)
            .or()
            .areAnnotatedWith(ParameterizedTest.class)
            .should()
            .haveNameStartingWith("should");

    @ArchTest
    static final ArchRule shouldSayWhatARuleShows =
            fields().that().areAnnotatedWith(ArchTest.class).should().haveNameStartingWith("should");

    private static boolean hasTests(JavaClass type) {
        return type.getMethods().stream()
                .anyMatch(m -> m.isAnnotatedWith(Test.class) || m.isAnnotatedWith(ParameterizedTest.class));
    }
}
