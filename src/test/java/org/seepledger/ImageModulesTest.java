package org.seepledger;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.spi.ToolProvider;
import org.junit.jupiter.api.Test;
import org.seepledger.job.Version;

/** The app image has the parts of Java that the program uses. */
class ImageModulesTest {

    @Test
    void holdTheModulesThatOurOwnClassesNeed() throws Exception {
        Path classes = Path.of(Version.class
                .getProtectionDomain()
                .getCodeSource()
                .getLocation()
                .toURI());
        StringWriter found = new StringWriter();
        ToolProvider.findFirst("jdeps")
                .orElseThrow()
                .run(
                        new PrintWriter(found, true),
                        new PrintWriter(found, true),
                        "--ignore-missing-deps",
                        "--print-module-deps",
                        classes.resolve("org").toString());
        assertThat(modules()).contains(found.toString().strip().split(","));
    }

    @Test
    void areThoseOfThisJava() throws IOException {
        assertThat(modules())
                .allMatch(module ->
                        java.lang.module.ModuleFinder.ofSystem().find(module).isPresent());
    }

    private static Set<String> modules() throws IOException {
        Matcher list = Pattern.compile("<image.modules>([^<]*)<").matcher(Files.readString(Path.of("pom.xml")));
        assertThat(list.find()).isTrue();
        return Set.of(list.group(1).split(","));
    }
}
