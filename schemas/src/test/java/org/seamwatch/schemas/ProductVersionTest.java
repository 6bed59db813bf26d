package org.seamwatch.schemas;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class ProductVersionTest {

    private static final Pattern PARENT =
            Pattern.compile("<artifactId>seamwatch</artifactId>\\s*<version>([^<]*)</version>");

    @Test
    void shouldBeTheVersionOfTheBuild() throws IOException {
        Matcher parent = PARENT.matcher(Files.readString(Path.of("pom.xml")));

        assertThat(parent.find()).isTrue();
        assertThat(ProductVersion.CURRENT).isEqualTo(parent.group(1));
    }
}
