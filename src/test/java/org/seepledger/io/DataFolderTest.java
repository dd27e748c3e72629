package org.seepledger.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.fault.DataFault;

class DataFolderTest {

    @TempDir
    Path temporary;

    private Path set;
    private DataFolder folder;

    @BeforeEach
    void makeFolders() throws IOException {
        set = Files.createDirectories(temporary.resolve("set/surfaces")).getParent();
        Files.writeString(set.resolve("ground.tif"), "");
        Files.writeString(set.resolve("surfaces/base.tif"), "");
        Files.writeString(temporary.resolve("secret.tif"), "");
        folder = DataFolder.holding(set.resolve("aquifer.json"), "set/aquifer.json");
    }

    @Test
    void findsFilesBelowTheFolder() {
        assertThat(folder.resolve("ground.tif", "top")).isEqualTo(set.resolve("ground.tif"));
        assertThat(folder.resolve("surfaces/base.tif", "top")).isEqualTo(set.resolve("surfaces/base.tif"));
    }

    @ParameterizedTest
    @CsvSource({
        "../secret.tif, leads out of the folder",
        "surfaces/../ground.tif, leads out of the folder",
        "/etc/hosts, found the path",
        "C:ground.tif, found the path",
        "'surfaces\\base.tif', found the path",
        "'', found the path",
        "'a\0b', cannot be the name of a file",
        "surfaces, is not a plain file",
        "surface/base.tif, whose folder does not exist",
        "ground.tiff, Did you mean \"ground.tif\"?",
        "surfaces/BASES.TIF, Did you mean \"base.tif\"?",
        "recharge.tif, which does not exist",
    })
    void refusesEverythingElse(String path, String message) {
        assertThatThrownBy(() -> folder.resolve(path, "layers[0].top"))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("set/aquifer.json, layers[0].top: found the path ")
                .hasMessageContaining(message);
    }

    @Test
    void refusesALinkThatLeadsOut() throws IOException {
        Files.createSymbolicLink(set.resolve("out.tif"), temporary.resolve("secret.tif"));
        Files.createSymbolicLink(set.resolve("away"), temporary);
        Files.createSymbolicLink(set.resolve("within.tif"), set.resolve("ground.tif"));
        assertThatThrownBy(() -> folder.resolve("out.tif", "top")).hasMessageContaining("leads out of the folder");
        assertThatThrownBy(() -> folder.resolve("away/secret.tif", "top")).hasMessageContaining("leads out");
        assertThat(folder.resolve("within.tif", "top")).isEqualTo(set.resolve("within.tif"));
    }

    @Test
    void worksThroughALinkToTheFolderItself() throws IOException {
        Files.createSymbolicLink(temporary.resolve("link"), set);
        DataFolder linked = DataFolder.holding(temporary.resolve("link/aquifer.json"), "aquifer.json");
        assertThat(linked.resolve("ground.tif", "top")).exists();
    }
}
