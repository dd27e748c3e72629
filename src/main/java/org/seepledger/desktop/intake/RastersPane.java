package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;
import javafx.geometry.VPos;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.image.ImageView;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseFile;
import org.seepledger.intake.Means;
import org.seepledger.unit.Figures;

/** Rasters: a small map, what names and bands count, what is made of them. */
final class RastersPane extends VBox {

    private static final double WIDTH = 250;
    private static final double HEIGHT = 210;
    private static final double BESIDE = 230;

    /** 9 comes before 10. */
    private static final Comparator<String> BY_NUMBER =
            Comparator.comparingInt(String::length).thenComparing(Comparator.naturalOrder());

    private final IntakeModel model;
    private final Item.Rasters item;
    private final ImageView image = new ImageView();
    private final Label facts = new Label();
    private final ComboBox<Integer> file;
    private final ComboBox<Integer> band;

    RastersPane(IntakeModel model, Item.Rasters item) {
        super(14);
        this.model = model;
        this.item = item;
        List<Integer> files = IntStream.range(0, item.files().size()).boxed().toList();
        List<Integer> bands = IntStream.range(0, item.bandCount()).boxed().toList();
        this.file = Form.choice(
                "intake-file", files, 0, index -> item.files().get(index).shownName(), index -> look());
        this.band = Form.choice("intake-band", bands, 0, RastersPane::band, index -> look());
        getChildren().addAll(preview(), counts());
        for (int use = 0; use < item.uses().size(); use++) {
            getChildren().add(new UsePane(model, item, use));
        }
        look();
    }

    private static String band(int index) {
        return Words.of("intake.band", index + 1);
    }

    private FlowPane preview() {
        image.setPreserveRatio(true);
        image.setSmooth(false);
        image.setFitWidth(WIDTH);
        image.setFitHeight(HEIGHT);
        image.setId("intake-preview");
        StackPane frame = new StackPane(image);
        frame.getStyleClass().add("sl-preview");
        frame.setMinSize(WIDTH + 12, HEIGHT + 12);
        frame.setMaxSize(WIDTH + 12, HEIGHT + 12);
        facts.setWrapText(true);
        file.setMaxWidth(BESIDE);
        VBox beside = new VBox(8, facts);
        if (item.files().size() > 1) {
            Button leaveOut = new Button(Words.of("intake.leave.out"));
            leaveOut.setId("intake-leave-out");
            leaveOut.getStyleClass().add("small");
            leaveOut.setOnAction(pressed -> model.leaveOut(file.getValue()));
            beside.getChildren().add(0, file);
            beside.getChildren().add(leaveOut);
        }
        if (item.bandCount() > 1) {
            beside.getChildren().add(beside.getChildren().indexOf(facts), band);
        }
        beside.setPrefWidth(BESIDE);
        FlowPane preview = new FlowPane(16, 10, frame, beside);
        preview.setPrefWrapLength(WIDTH);
        preview.setRowValignment(VPos.TOP);
        return preview;
    }

    private void look() {
        LooseFile.Raster raster = item.files().get(file.getValue());
        LooseFile.BandLook look = raster.bands().get(band.getValue());
        List<String> lines = new ArrayList<>();
        lines.add(Words.of("intake.raster.cells", raster.rows(), raster.columns()));
        if (!look.description().isEmpty()) {
            lines.add(look.description());
        }
        lines.add(
                Double.isNaN(look.least())
                        ? Words.of("intake.raster.none")
                        : Words.of(
                                "intake.raster.range",
                                Figures.typeset(look.least()),
                                Figures.typeset(look.greatest())));
        lines.add(
                look.missing() == 0
                        ? Words.of("intake.raster.full")
                        : Words.of("intake.raster.missing", Figures.typeset(Math.round(1000 * look.missing()) / 10.0)));
        lines.add(raster.place()
                .map(place -> Words.of(
                        "intake.raster.place",
                        Figures.typeset(place.mapX(0, raster.rows())),
                        Figures.typeset(place.mapY(0, raster.rows())),
                        Figures.typeset(Math.hypot(place.columnX(), place.columnY())),
                        place.crs()
                                .map(crs -> crs.startsWith("EPSG") ? crs : Words.of("intake.raster.wkt"))
                                .orElse(Words.of("intake.raster.nocrs"))))
                .orElse(Words.of("intake.raster.noplace")));
        facts.setText(String.join("\n", lines));
        image.setImage(null);
        model.preview(raster, band.getValue(), seen -> image.setImage(RasterImage.of(seen)));
    }

    private Form counts() {
        Form form = new Form();
        List<Means> choices = List.of(Means.LAYER, Means.TIME, Means.NOTHING);
        for (int field = 0; field < item.fields().size(); field++) {
            int index = field;
            TreeSet<String> texts = new TreeSet<>(BY_NUMBER);
            item.names().forEach(name -> texts.add(name.fields().get(index).text()));
            if (texts.size() > 1 || item.fields().get(field) != Means.NOTHING) {
                form.line(
                        Words.of("intake.field", few(texts)),
                        Form.choice(
                                "intake-field-" + field,
                                choices,
                                item.fields().get(field),
                                UsePane::means,
                                means -> model.change(now -> ((Item.Rasters) now).withField(index, means))));
            }
        }
        if (item.bandCount() > 1 && item.uses().size() == 1) {
            form.line(
                    Words.of("intake.bands", item.bandCount()),
                    Form.choice(
                            "intake-bands",
                            choices,
                            item.bands(),
                            UsePane::means,
                            means -> model.change(now -> ((Item.Rasters) now).withBands(means))));
        }
        form.setManaged(!form.getChildren().isEmpty());
        return form;
    }

    private static String few(TreeSet<String> texts) {
        return texts.size() <= 3 ? String.join(", ", texts) : texts.first() + " … " + texts.last();
    }
}
