package org.seepledger.desktop.handover;

import java.time.Month;
import java.time.format.TextStyle;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.Node;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.page.Amounts;

/** What can be chosen, as forms one below the other. */
final class ChoicesView extends VBox {

    private final HandoverModel model;
    private final HandoverChoices choices;
    private ChoiceBox<Periods.Every> every;

    ChoicesView(HandoverModel model) {
        this.model = model;
        this.choices = model.choices();
        getStyleClass().add("sl-forms");
        Fields plume = solutes();
        getChildren().addAll(outputs(), budget(), report(), plume, pictures());
        open(plume, choices.plume());
    }

    /** Shows a form only while it matters. */
    private static void open(Node form, ObservableBooleanValue wanted) {
        form.visibleProperty().bind(wanted);
        form.managedProperty().bind(wanted);
    }

    /** The open set may have other periods to choose from. */
    void refresh() {
        every.getItems().setAll(model.periodChoices());
        every.setValue(choices.budget().every().get());
    }

    private Fields outputs() {
        Fields fields = new Fields().heading("what");
        fields.check("water", choices.water());
        Node plume = fields.check("plume", choices.plume());
        plume.setDisable(true);
        model.stage().addListener((stage, before, after) -> plume.setDisable(!model.hasSolutes()));
        choices.plume().addListener((wanted, before, after) -> plume.setDisable(!model.hasSolutes()));
        fields.check("extract", choices.extract());
        return fields;
    }

    private Fields budget() {
        BudgetChoices budget = choices.budget();
        Fields fields = new Fields().heading("budget");
        every = fields.choice("every", model.periodChoices(), ChoicesView::words, budget.every());
        BooleanBinding fromFile = budget.periods().text().isNotEmpty();
        every.disableProperty().bind(fromFile);
        ChoiceBox<Integer> month = fields.choice(
                "month",
                IntStream.rangeClosed(1, 12).boxed().toList(),
                ChoicesView::month,
                budget.waterYearStart().asObject());
        month.disableProperty().bind(fromFile.or(Bindings.notEqual(Periods.Every.WATER_YEAR, budget.every())));
        fields.path("periods", budget.periods(), budget.periods().problem(), model.questions()::periods);
        fields.text("rate", budget.rateUnit());
        fields.text("volume", budget.volumeUnit());
        fields.text("limit", budget.limit());
        fields.choice("wells", List.of(WellRule.values()), ChoicesView::words, budget.wells());
        fields.check("clip", budget.clip());
        return fields;
    }

    private Fields report() {
        ReportChoices report = choices.report();
        Fields fields = new Fields().heading("report");
        fields.text("title", report.title());
        fields.text("author", report.author());
        fields.text("reference", report.reference());
        fields.lines("letterhead", report.letterhead());
        fields.text("date", report.date());
        fields.choice("tables", List.of(ReportChoices.Tables.values()), ChoicesView::words, report.tables());
        fields.choice("amounts", List.of(Amounts.values()), ChoicesView::words, report.amounts());
        open(fields, choices.water().or(choices.plume()));
        return fields;
    }

    private Fields solutes() {
        SoluteChoices solutes = choices.solutes();
        Fields fields = new Fields().heading("solutes");
        fields.text("massrate", solutes.rateUnit());
        fields.text("mass", solutes.massUnit());
        TextField above = fields.text("above", solutes.above());
        above.setPrefColumnCount(12);
        fields.path("transects", solutes.transects(), solutes.transects().problem(), model.questions()::transects);
        fields.path("panels", solutes.panels(), solutes.panels().problem(), model.questions()::panels);
        fields.check("dispersion", solutes.dispersion());
        return fields;
    }

    private Fields pictures() {
        PictureChoices pictures = choices.pictures();
        Fields fields = new Fields().heading("pictures");
        fields.check("maps", pictures.maps())
                .disableProperty()
                .bind(choices.water().not());
        fields.check("sections", pictures.sections())
                .disableProperty()
                .bind(choices.water().not());
        fields.check("shown", pictures.shown()).disableProperty().bind(Bindings.isEmpty(pictures.offered()));
        fields.checks("format", List.of("svg", "png"), List.of(pictures.svg(), pictures.png()));
        return fields;
    }

    private static String words(Enum<?> choice) {
        return Words.of("handover.choice." + CommandText.word(choice));
    }

    private static String month(int month) {
        return Month.of(month).getDisplayName(TextStyle.FULL, Locale.ENGLISH);
    }
}
