package org.seepledger.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.intake.Wishes.Topic;

class CompositionTest {

    @TempDir
    private Path folder;

    private LooseFolder loose;

    @BeforeEach
    void begin() {
        loose = new LooseFolder(folder);
    }

    private static List<String> faults(Composition composition) {
        return composition.findings().stream()
                .filter(finding -> finding.level() == Finding.Level.FAULT)
                .map(Finding::words)
                .toList();
    }

    @SuppressWarnings("unchecked")
    private static Map<String, Object> part(Composition composition, String key) {
        return (Map<String, Object>) composition.set().get(key);
    }

    private LooseFolder oneLayer() {
        return loose.raster("top.tif", 20)
                .raster("bottom.tif", 0)
                .raster("K.tif", 5)
                .raster("head.tif", 15);
    }

    @Test
    void oneLayerInASteadyStateNeedsNothingSaid() {
        Composition composition = Composition.of(oneLayer().plan(), false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.flow()).isEqualTo("head_gradient");
        assertThat(composition.layers()).isEqualTo(1);
        assertThat(composition.times().intervals()).isEqualTo(1);
        assertThat(composition.set()).containsEntry("crs", "EPSG:32633").containsEntry("head", "head.tif");
        assertThat(composition.findings())
                .extracting(Finding::words)
                .anyMatch(words -> words.contains("a year of 365 days"))
                .anyMatch(words -> words.contains("no recharge"));
    }

    @ParameterizedTest
    @CsvSource({
        "head_l%d_t%02d.tif, 0",
        "head-%d-%d.tif, 1",
        "layer%d/head_%03d.tif, 0",
        "L%d Head step %d.tif, 5",
        "heads/%d_%d_heads.tif, 0",
    })
    void layersAndTimesAreReadFromManyStylesOfNames(String style, int first) {
        for (int layer = 1; layer <= 2; layer++) {
            for (int time = 0; time < 4; time++) {
                int count = time;
                loose.raster(style.formatted(layer, first + time), (row, column) -> 15 + count);
            }
            loose.raster("bottom_" + layer + ".tif", 20 - 10 * layer).raster("K_" + layer + ".tif", 5);
        }
        Plan plan = loose.raster("top.tif", 20).plan();
        plan = LooseFolder.said(plan, Topic.TIMES, "every 10");
        plan = LooseFolder.said(plan, Topic.VERTICAL_SHARE, "0.1");
        Composition composition = Composition.of(plan, false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.layers()).isEqualTo(2);
        assertThat(composition.times().instants()).containsExactly(0.0, 10.0, 20.0, 30.0);
        assertThat(composition.set().get("head")).isEqualTo("head_l{layer}_{instant}.tif");
        assertThat(composition.copies()).extracting(Copy::to).contains("head_l2_0.tif", "head_l2_3.tif");
        Copy last = composition.copies().stream()
                .filter(copy -> copy.to().equals("head_l2_3.tif"))
                .findFirst()
                .orElseThrow();
        assertThat(last.from()).isEqualTo(folder.resolve(style.formatted(2, first + 3)));
    }

    @Test
    void layersThatNamesCountFromZeroAreCountedOn() {
        for (int layer = 0; layer < 3; layer++) {
            loose.raster("bottom_" + layer + ".tif", 10 - 10 * layer).raster("kx_" + layer + ".tif", 5 + layer);
        }
        Composition composition = Composition.of(
                LooseFolder.said(
                        loose.raster("top.tif", 20).raster("head.tif", 15).plan(), Topic.VERTICAL_SHARE, "1"),
                false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.layers()).isEqualTo(3);
        assertThat(part(composition, "flow")).containsEntry("conductivity", "conductivity_l{layer}.tif");
    }

    @Test
    void numberedSurfacesAreOrderedByTheirHeights() {
        for (int surface = 0; surface < 4; surface++) {
            loose.raster("surface_" + surface + ".tif", 30 - 10 * surface);
        }
        Composition composition = Composition.of(loose.plan(), false);
        assertThat(composition.layers()).isEqualTo(3);
        assertThat(faults(composition)).noneMatch(words -> words.contains("Nothing gives the bottom"));
        Copy lowest = composition.copies().stream()
                .filter(copy -> copy.to().equals("bottom_l3.tif"))
                .findFirst()
                .orElseThrow();
        assertThat(lowest.from()).endsWith(Path.of("surface_3.tif"));
    }

    @Test
    void monthsInNamesMakeTimesAndTheStart() {
        for (int month = 10; month <= 12; month++) {
            loose.raster("recharge_2021-" + month + "_mm_yr.tif", 100);
        }
        Composition composition = Composition.of(oneLayer().plan(), false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.times().instants()).containsExactly(0.0, 31.0, 61.0, 92.0);
        assertThat(composition.times().start()).isEqualTo("2021-10-01");
        assertThat(composition.set().get("sources").toString()).contains("recharge_{interval}.tif", "unit=mm/yr");
    }

    @Test
    void asManyHeadsAsIntervalsAreAskedAbout() {
        for (int month = 10; month <= 12; month++) {
            loose.raster("recharge_2021-" + month + ".tif", 100).raster("head_" + (month - 9) + ".tif", 15);
        }
        Plan plan = loose.raster("top.tif", 20)
                .raster("bottom.tif", 0)
                .raster("K.tif", 5)
                .plan();
        assertThat(faults(Composition.of(plan, false)))
                .singleElement()
                .asString()
                .contains("3 instants", "3 intervals have 4 ends", "leave the first interval out");
        Composition composition = Composition.of(LooseFolder.said(plan, Topic.SKIP_FIRST, "yes"), false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.times().start()).isEqualTo("2021-11-01");
        assertThat(composition.times().instants()).containsExactly(0.0, 30.0, 61.0);
        Copy first = composition.copies().stream()
                .filter(copy -> copy.to().equals("recharge_1.tif"))
                .findFirst()
                .orElseThrow();
        assertThat(first.from()).endsWith(Path.of("recharge_2021-11.tif"));
        assertThat(composition.copies())
                .extracting(Copy::to)
                .contains("head_0.tif")
                .doesNotContain("recharge_3.tif");
    }

    @Test
    void aRasterOfAnotherGridIsNamedWithBothGrids() {
        Grid other = new Grid(Axis.even(1000, 5, 10), Axis.even(2000, 5, 8), 0, 1);
        Composition composition = Composition.of(
                oneLayer().raster("recharge.tif", other, (row, column) -> 1).plan(), false);
        assertThat(faults(composition))
                .singleElement()
                .asString()
                .startsWith("recharge.tif lies on another grid: 8 rows × 10 columns")
                .contains("4 rows × 5 columns");
    }

    @Test
    void cellCentresMakeTheGridWhereThereIsNoRaster() {
        loose.text(
                "cells.csv",
                "easting;northing;ground (m);base (m);K [m/d];head_m",
                "500025;5200025;20,5;0;5;15,25",
                "500075;5200025;20,5;0;5;15,5",
                "500025;5200075;20,5;0;5;15",
                "500075;5200075;20,5;0;5;15,75");
        Composition composition = Composition.of(loose.plan(), false);
        assertThat(faults(composition)).isEmpty();
        assertThat(part(composition, "grid"))
                .containsEntry("x", Map.of("from", 500000L, "step", 50L, "count", 2))
                .containsEntry("y", Map.of("from", 5200000L, "step", 50L, "count", 2));
        assertThat(composition.copies()).singleElement().isInstanceOf(Copy.Mended.class);
        assertThat(Composition.of(loose.plan(), true).obstacles())
                .singleElement()
                .asString()
                .contains("easting", "must be called \"x\"");
    }

    @Test
    void twoFilesForTheSameAreSaid() {
        Composition composition =
                Composition.of(oneLayer().raster("hydraulic head.tif", 14).plan(), false);
        assertThat(faults(composition)).singleElement().asString().contains("both give the head of layer 1");
    }

    @Test
    void aMissingStepIsSaid() {
        for (int layer = 1; layer <= 2; layer++) {
            for (int time = 0; time < 4; time++) {
                if (layer == 1 || time != 2) {
                    loose.raster("head_l%d_t%d.tif".formatted(layer, time), 15);
                }
            }
        }
        assertThat(faults(Composition.of(loose.raster("top.tif", 20).plan(), false)))
                .anyMatch(words -> words.contains("Of layer 2") && words.contains("has 3 files where others have 4"));
    }

    @Test
    void whatIsMissingIsSaidWithWhatToDo() {
        Composition composition = Composition.of(loose.raster("head.tif", 3).plan(), false);
        assertThat(faults(composition))
                .anyMatch(words -> words.contains("the top of layer 1"))
                .anyMatch(words -> words.contains("the bottom of layer 1"))
                .anyMatch(words -> words.contains("Nothing tells how water flows"));
        assertThat(composition.isSound()).isFalse();
    }

    @Test
    void numbersAreTypedWhereNoFileGivesThem() {
        Plan plan = loose.raster("head.tif", 3).plan();
        for (Map.Entry<Topic, String> typed : Map.of(
                        Topic.TOP, "20",
                        Topic.BOTTOM, "10, 0",
                        Topic.CONDUCTIVITY, "5",
                        Topic.VERTICAL_SHARE, "0.1",
                        Topic.RECHARGE, "120 mm/yr")
                .entrySet()) {
            plan = LooseFolder.said(plan, typed.getKey(), typed.getValue());
        }
        Composition composition = Composition.of(plan, false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.layers()).isEqualTo(2);
        assertThat(part(composition, "flow"))
                .containsEntry("conductivity", 5L)
                .containsEntry("vertical_conductivity", 0.5);
        assertThat(composition.set().get("sources").toString()).contains("value=120", "unit=mm/yr");
    }

    @Test
    void marksOfActiveCellsAreWorkedIn() {
        Plan plan = oneLayer()
                .raster("active.tif", (row, column) -> column == 0 ? 0 : 1)
                .plan();
        Composition composition = Composition.of(plan, false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.copies())
                .filteredOn(Copy.Masked.class::isInstance)
                .extracting(Copy::to)
                .containsExactly("conductivity.tif");
        assertThat(Composition.of(plan, true).obstacles()).anyMatch(words -> words.contains("active.tif"));
    }

    @Test
    void whatTakesWaterIsTurned() {
        Plan plan = oneLayer()
                .raster("evapotranspiration.tif", 300)
                .text("wells.csv", "name,x,y,layer,rate [m3/d]", "W 1,1015,2015,1,40")
                .plan();
        assertThat(LooseFolder.item(plan, "evapo").uses().get(0).turned()).isTrue();
        assertThat(LooseFolder.item(plan, "wells").uses().get(0).turned()).isTrue();
        Composition composition = Composition.of(plan, false);
        assertThat(composition.set().get("sources").toString()).contains("scale=-1");
        assertThat(composition.copies())
                .filteredOn(copy -> copy.to().equals("wells.csv"))
                .singleElement()
                .isInstanceOf(Copy.Mended.class);
    }

    @Test
    void wellsWithDatesNeedAStart() {
        Plan plan = oneLayer()
                .text("wells.csv", "well;x;y;layer;from;to;Q [m3/h]", "W 1;1015;2015;1;01.10.2021;;-2,5")
                .plan();
        assertThat(faults(Composition.of(plan, false)))
                .singleElement()
                .asString()
                .contains("date of instant 0");
        assertThat(faults(Composition.of(LooseFolder.said(plan, Topic.START, "2021-10-01"), false)))
                .isEmpty();
    }

    @Test
    void concentrationsMakeSolutesAndThoseOfASourceAreItsOwn() {
        Plan plan = oneLayer()
                .text("chloride.csv", "row,col,chloride [mg/l]", "1,1,<0.5", "1,2,3")
                .text("leak.csv", "row,col,leak [m3/d],chloride [mg/L]", "1,1,2,900")
                .plan();
        plan = LooseFolder.said(plan, Topic.POROSITY, "0.25");
        Composition composition = Composition.of(plan, false);
        assertThat(faults(composition)).isEmpty();
        assertThat(composition.set().get("solutes").toString())
                .contains("name=chloride", "unit=mg/L", "porosity=0.25", "chloride.csv")
                .doesNotContain("leak.csv");
        assertThat(composition.set().get("sources").toString()).contains("concentration={chloride=");
    }

    @Test
    void layersAreNamedAfterWhatTheirBottomsAreTheBottomsOf() {
        loose.raster("ground.tif", 30)
                .raster("gravel_base.tif", 20)
                .raster("Clay bottom.tif", 10)
                .raster("bedrock.tif", 0);
        Composition composition = Composition.of(loose.plan(), false);
        assertThat(composition.set().get("layers").toString())
                .contains("name=Gravel", "name=Clay")
                .doesNotContain("name=Bedrock");
        Composition said = Composition.of(LooseFolder.said(loose.plan(), Topic.LAYERS, "Sand, Silt, Rock"), false);
        assertThat(said.set().get("layers").toString()).contains("name=Sand", "name=Silt", "name=Rock");
    }

    @Test
    void ratesOfAWellThatWouldAddUpAreRefused() {
        Plan plan = oneLayer()
                .text(
                        "wells.csv",
                        "name,x,y,layer,date,rate",
                        "W,1015,2015,1,2021-10-01,-5",
                        "W,1015,2015,1,2021-11-01,-6")
                .plan();
        assertThat(faults(Composition.of(LooseFolder.said(plan, Topic.START, "2021-10-01"), false)))
                .singleElement()
                .asString()
                .contains("they would add up");
    }

    @Test
    void filesOfOtherKindsAreLeftOutWithWhatToDo() {
        Plan plan = oneLayer()
                .text("dem.asc", "ncols 4")
                .text("wells.xlsx", "PK")
                .text("zones.shp", "x")
                .text("cells.txt", "x y head", "1 2 3")
                .plan();
        assertThat(((Item.Other) LooseFolder.item(plan, "dem.asc")).file().words())
                .contains("gdal_translate");
        assertThat(((Item.Other) LooseFolder.item(plan, "xlsx")).file().words()).contains("Save the sheet as CSV");
        assertThat(((Item.Other) LooseFolder.item(plan, "shp")).file().words()).contains("ogr2ogr");
        assertThat(Composition.of(plan, false).findings())
                .extracting(Finding::words)
                .anyMatch(words -> words.contains("cells.txt has a single column"));
    }

    @Test
    void anEmptyFileAndGarbageAreSaidAndDoNotStopTheRest() throws IOException {
        Files.createFile(folder.resolve("void.csv"));
        Plan plan = oneLayer()
                .text("noise.tif", "no raster")
                .text("ragged.csv", "x,y,head", "1,2")
                .plan();
        Composition composition = Composition.of(plan, false);
        assertThat(composition.isSound()).isTrue();
        assertThat(composition.findings())
                .extracting(Finding::words)
                .anyMatch(words -> words.startsWith("noise.tif") && words.endsWith("left out."))
                .anyMatch(words -> words.startsWith("void.csv is empty"))
                .anyMatch(words -> words.startsWith("ragged.csv, line 2"));
    }
}
