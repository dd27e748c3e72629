package org.seepledger.io.prisms;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Drawn;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.RingAt;
import org.seepledger.sketch.Shape;

/** Drawings to files and back. */
class DrawingFilesTest {

    private static final PlanCrs UTM = PlanCrs.of("EPSG:32633", "aquifer.json", "crs");
    private static final Grid GRID = new Grid(Axis.even(499_000, 50, 60), Axis.even(5_199_000, 50, 60), 0, 1);
    private static final Shape BOX = Shape.of("box", Drawn.box(499_100.1, 5_199_100.2, 499_300, 5_199_300));

    @TempDir
    Path folder;

    private final List<String> notes = new ArrayList<>();

    private Path written(Drawing drawing) {
        Path file = folder.resolve("drawing.geojson");
        DrawingWriter.write(file, UTM.code(), drawing);
        return file;
    }

    private PrismsReader prisms() {
        SurfaceReader surfaces = (raster, shown) -> GriddedValues.constant(shown.length());
        return new PrismsReader(UTM, GRID, FourLayers.ALL, false, surfaces, notes::add, notes::add);
    }

    private Drawing read(Path file) {
        return new DrawingReader(UTM, 4, notes::add).read(file, "drawing.geojson");
    }

    private Drawing read(String text) throws IOException {
        return read(Files.writeString(folder.resolve("given.geojson"), text));
    }

    @Test
    void keepsAllThatWasDrawnAndTyped() {
        Map<String, String> others = new LinkedHashMap<>();
        others.put("zone", "\"Ä 1\"");
        others.put("list", "[1,{\"a\":null}]");
        others.put("area", "12.5");
        Shape shape = BOX.with(Drawn.box(499_150, 5_199_150, 499_200, 5_199_200)
                        .under(List.of(0, 1, 2, 3), Optional.of("well ring")))
                .noted("first line\n\"second\"")
                .keeping(others)
                .reaching(new Reach.Layers(1, 2));
        Drawing drawing = Drawing.EMPTY
                .with(shape)
                .with(Shape.of(
                                "other",
                                Drawn.box(499_500, 5_199_100, 499_600, 5_199_200)
                                        .under(List.of(0, 1, 3), Optional.of("bank")))
                        .reaching(new Reach.Between(
                                Optional.of(new Limit.Elevation(0.1)), Optional.of(new Limit.Surface("s/base.tif")))))
                .with(Shape.of("on a layer", Drawn.box(499_500, 5_199_400, 499_600, 5_199_500))
                        .reaching(new Reach.Between(
                                Optional.of(new Limit.Elevation(95)), Optional.of(new Limit.Layer(1)))))
                .with(Drawn.ofParts("parts", Drawn.box(499_700, 5_199_100, 499_800, 5_199_200)));
        Drawing back = read(written(drawing));
        assertThat(back).isEqualTo(drawing.edit(new RingAt("box", 1, 1), this::turned));
        assertThat(back.shape("box").others().keySet()).containsExactly("zone", "list", "area");
        assertThat(notes).isEmpty();
        assertThat(written(drawing))
                .content()
                .contains("\"well ring\" : [ \"island 1\" ]", "\"bank\" : [ \"side 1-2\", \"side 4\" ]");
    }

    /** An island is written clockwise, from its first vertex. */
    private Outline turned(Outline drawn) {
        List<Place> places = new ArrayList<>(drawn.places());
        Collections.reverse(places.subList(1, places.size()));
        return Outline.through(places).under(List.of(0, 1, 2, 3), Optional.of("well ring"));
    }

    @Test
    void anEmptyDrawingAndOneThatCrossesItselfComeBack() {
        assertThat(read(written(Drawing.EMPTY))).isEqualTo(Drawing.EMPTY);
        Shape bow = Drawn.shape("bow", 0, 0, 10, 10, 10, 0, 0, 12);
        Drawing back = read(written(Drawing.EMPTY.with(bow)));
        assertThat(back.shape("bow").flaw()).isPresent();
        assertThat(notes).hasSize(1);
        assertThat(notes.get(0))
                .startsWith(
                        "drawing.geojson, feature 1 \"bow\", outer ring: found a ring that crosses or touches itself");
    }

    @Test
    void localDrawingsHaveNoCrs() {
        Path file = folder.resolve("local.geojson");
        DrawingWriter.write(file, Optional.empty(), Drawing.EMPTY.with(BOX));
        assertThat(file).content().doesNotContain("crs");
        assertThat(new DrawingReader(PlanCrs.local(), 4, notes::add).read(file, "f"))
                .isEqualTo(Drawing.EMPTY.with(BOX));
    }

    @Test
    void namesACrsWithoutCodeByItsText() {
        PlanCrs own = PlanCrs.of(UTM.wkt().replaceAll(",\\s*AUTHORITY\\[[^\\]]*\\]", ""), "aquifer.json", "crs");
        assertThat(own.code()).isEmpty();
        Path file = folder.resolve("own.geojson");
        DrawingWriter.write(file, Optional.of(own.wkt()), Drawing.EMPTY.with(BOX));
        assertThat(new DrawingReader(own, 4, notes::add).read(file, "f")).isEqualTo(Drawing.EMPTY.with(BOX));
    }

    @Test
    void takesLongitudesAndLatitudesToTheMap() throws IOException {
        // gdaltransform -s_srs EPSG:4326 -t_srs EPSG:32633, GDAL 3.6.2 with PROJ 9.1.1.
        Drawing drawing = read("{\"type\": \"Feature\", \"properties\": {\"name\": \"A\", \"note\": 7}, \"geometry\":"
                + " {\"type\": \"Polygon\", \"coordinates\":"
                + " [[[14.97,46.93],[14.99,46.93],[14.99,46.95],[14.97,46.95],[14.97,46.93]]]}}");
        Place first = drawing.outline(RingAt.outer("A")).place(0);
        assertThat(first.x()).isEqualTo(497716.255646239, within(1e-5));
        assertThat(first.y()).isEqualTo(5197385.7485689, within(1e-5));
        assertThat(drawing.shape("A").note()).isEqualTo("7");
        assertThat(notes).hasSize(1);
        assertThat(prismsOf(read(written(drawing)))).isEqualTo(prismsOf(drawing));
    }

    private static List<Prism> prismsOf(Drawing drawing) {
        return drawing.shapes().stream().map(shape -> shape.prism(4, null)).toList();
    }

    @Test
    void takesNotesOfAnyKind() throws IOException {
        String feature = "{\"type\": \"Feature\", \"properties\": {\"name\": \"A\", \"note\": %s}, \"geometry\":"
                + " {\"type\": \"Polygon\", \"coordinates\": [[[14.97,46.93],[14.99,46.93],[14.99,46.95],[14.97,46.93]]]}}";
        assertThat(read(feature.formatted("null")).shape("A").note()).isEmpty();
        assertThat(read(feature.formatted("[1, 2]")).shape("A").note()).isEqualTo("[1,2]");
        assertThat(read(feature.formatted("\"a\"")).shape("A").others()).isEmpty();
    }

    @Test
    void aDrawingMakesThePrismsOfItsFile() throws IOException {
        Files.writeString(folder.resolve("base.tif"), "");
        Drawing drawing = Drawing.EMPTY.with(BOX.reaching(
                new Reach.Between(Optional.of(new Limit.Elevation(7)), Optional.of(new Limit.Surface("base.tif")))));
        Path file = written(drawing);
        Prism drawn = prisms().of(drawing, file, "drawing.geojson").get(0);
        Prism read = prisms().read(file, "drawing.geojson").get(0);
        assertThat(drawn.rings()).isEqualTo(read.rings());
        for (Prism prism : List.of(drawn, read)) {
            VerticalRange.Elevations range = (VerticalRange.Elevations) prism.range();
            assertThat(value(range.top().orElseThrow())).isEqualTo(7);
            assertThat(value(range.bottom().orElseThrow())).isEqualTo("base.tif".length());
        }
    }

    private static double value(GriddedValues surface) {
        double[] values = new double[1];
        surface.read(0, 0, new Window(0, 0, 1, 1), values, 0);
        return values[0];
    }

    @Test
    void saysWhyADrawingMakesNoPrisms() {
        Path file = folder.resolve("drawing.geojson");
        Drawing lost = Drawing.EMPTY.with(
                BOX.reaching(new Reach.Between(Optional.empty(), Optional.of(new Limit.Surface("lost.tif")))));
        assertThatThrownBy(() -> prisms().of(lost, file, "drawing.geojson"))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith(
                        "drawing.geojson, \"box\", bottom: found the path \"lost.tif\", which does not exist");
        Drawing bow = Drawing.EMPTY.with(Drawn.shape("bow", 0, 0, 10, 10, 10, 0, 0, 10));
        assertThatThrownBy(() -> prisms().of(bow, file, "drawing.geojson"))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("\"bow\", outer ring: found a ring that crosses or touches itself at x 5, y 5");
        Drawing outside = Drawing.EMPTY.with(BOX.moved(10_000, 0));
        assertThatThrownBy(() -> prisms().of(outside, file, "drawing.geojson"))
                .hasMessageContaining("lies outside the grid");
    }

    @Property(tries = 200)
    void readsBackToTheSamePrisms(@ForAll @IntRange(max = 1_000_000) int seed) throws IOException {
        Random random = new Random(seed);
        Drawing drawing = Drawing.EMPTY;
        for (int i = 0; i < 1 + random.nextInt(3); i++) {
            drawing = drawing.with(edited(Drawn.starShape(random, "star " + i), random));
        }
        Path file = Files.createTempFile("drawing", ".geojson");
        try {
            DrawingWriter.write(file, UTM.code(), drawing);
            List<Prism> expected = prismsOf(drawing);
            assertThat(prisms().read(file, "f")).isEqualTo(expected);
            assertThat(prisms().of(drawing, file, "f")).isEqualTo(expected);
            Drawing back = read(file);
            assertThat(prismsOf(back)).isEqualTo(expected);
            assertThat(back.shapes())
                    .extracting(Shape::note)
                    .isEqualTo(drawing.shapes().stream().map(Shape::note).toList());
            assertThat(back.shapes())
                    .extracting(Shape::reach)
                    .isEqualTo(drawing.shapes().stream().map(Shape::reach).toList());
            assertThat(bits(prismsOf(back))).isEqualTo(bits(expected));
        } finally {
            Files.delete(file);
        }
    }

    private static Shape edited(Shape star, Random random) {
        Shape shape = random.nextBoolean()
                ? star
                : star.with(star.moved(500, 0).parts().get(0));
        Shape reaching = random.nextBoolean() ? shape : shape.reaching(new Reach.Layers(random.nextInt(2), 2));
        return random.nextBoolean() ? reaching : reaching.noted("note \"" + random.nextInt() + "\"\n");
    }

    private static List<Long> bits(List<Prism> prisms) {
        List<Long> bits = new ArrayList<>();
        prisms.forEach(prism -> prism.rings().forEach(ring -> {
            for (Side side : ring.sides()) {
                bits.add(Double.doubleToRawLongBits(side.x()));
                bits.add(Double.doubleToRawLongBits(side.y()));
            }
        }));
        return bits;
    }
}
