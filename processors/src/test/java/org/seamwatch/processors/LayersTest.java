package org.seamwatch.processors;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.Set;

/** What computation must not touch: Kafka, files, clocks, threads and randomness without a seed. */
@AnalyzeClasses(packages = "org.seamwatch.processors", importOptions = ImportOption.DoNotIncludeTests.class)
class LayersTest {

    private static final Set<String> CLOCKS = Set.of("now", "currentTimeMillis", "nanoTime", "systemDefault");

    @ArchTest
    static final ArchRule shouldDependOnSchemasAndLibrariesOnly = classes()
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage(
                    "org.seamwatch.processors..",
                    "org.seamwatch.schemas..",
                    "java.lang..",
                    "java.math..",
                    "java.nio.charset..",
                    "java.security..",
                    "java.text..",
                    "java.time..",
                    "java.util..",
                    "com.fasterxml.jackson.annotation..",
                    "org.apache.commons..",
                    "org.jspecify..",
                    "org.locationtech.jts..");

    @ArchTest
    static final ArchRule shouldHaveNoThreadsOfItsOwn = noClasses()
            .should()
            .dependOnClassesThat(named(
                    "start or join threads",
                    type -> type.isAssignableTo(Thread.class)
                            || (type.getPackageName().startsWith("java.util.concurrent")
                                    && !type.getName().equals("java.util.concurrent.TimeUnit"))));

    @ArchTest
    static final ArchRule shouldNeverAskForTheTime = noClasses()
            .should()
            .callMethodWhere(new DescribedPredicate<JavaMethodCall>("it asks a clock or the machine's zone") {
                @Override
                public boolean test(JavaMethodCall call) {
                    return CLOCKS.contains(call.getTarget().getName())
                            && call.getTargetOwner().getPackageName().startsWith("java.");
                }
            })
            .orShould()
            .dependOnClassesThat()
            .areAssignableTo(java.time.Clock.class);

    @ArchTest
    static final ArchRule shouldDrawNothingWithoutASeed = noClasses()
            .should()
            .dependOnClassesThat(named(
                    "are the platform's generators",
                    type -> Set.of("java.util.Random", "java.util.SplittableRandom", "java.security.SecureRandom")
                            .contains(type.getName())))
            .orShould()
            .callMethod(Math.class, "random")
            .orShould()
            .callMethod(java.util.UUID.class, "randomUUID");

    @ArchTest
    static final ArchRule shouldUseStrictTranscendentalFunctions = noClasses()
            .should()
            .callMethodWhere(new DescribedPredicate<JavaMethodCall>("it is a function of Math that may differ") {
                private static final Set<String> LOOSE = Set.of(
                        "sin", "cos", "tan", "asin", "acos", "atan", "atan2", "exp", "expm1", "log", "log10", "log1p",
                        "pow", "cbrt", "sinh", "cosh", "tanh", "hypot");

                @Override
                public boolean test(JavaMethodCall call) {
                    return call.getTargetOwner().isEquivalentTo(Math.class)
                            && LOOSE.contains(call.getTarget().getName());
                }
            });

    @ArchTest
    static final ArchRule shouldRunNoParallelStreams = noClasses()
            .should()
            .callMethodWhere(new DescribedPredicate<JavaMethodCall>("it makes a stream parallel") {
                @Override
                public boolean test(JavaMethodCall call) {
                    return Set.of("parallel", "parallelStream")
                            .contains(call.getTarget().getName());
                }
            });

    private static DescribedPredicate<JavaClass> named(String words, java.util.function.Predicate<JavaClass> test) {
        return DescribedPredicate.describe(words, test);
    }
}
