package org.seepledger.io.aquifer;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Sorption;
import org.seepledger.io.aquifer.CheckedValues.Bounds;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads how a solute sorbs. */
final class SorptionReader {

    private static final Measure LITRE_PER_KG = Measure.of("L/kg");
    private static final List<String> LINEAR = List.of("kd", "koc", "foc");
    private static final List<String> FREUNDLICH = List.of("kf", "n");
    private static final List<String> LANGMUIR = List.of("capacity", "affinity");

    private final SoluteNode solute;
    private final SoluteNode sorption;
    private final Measure massPerLength3;
    private final Measure length3PerMass;

    private SorptionReader(SoluteNode solute, Measure length) {
        this.solute = solute;
        this.sorption = solute.inside("sorption");
        Measure kg = Measure.of("kg");
        this.massPerLength3 = kg.per(Measure.power(length, 3));
        this.length3PerMass = Measure.power(length, 3).per(kg);
    }

    /** The sorption of a solute, if it has any. */
    static Optional<Sorption> read(SoluteNode solute, Measure length) {
        return solute.has("sorption") ? Optional.of(new SorptionReader(solute, length).read()) : Optional.empty();
    }

    private Sorption read() {
        GriddedValues density = solute.required(
                "bulk_density",
                solute.values("bulk_density", Measure.of("kg/m3"), massPerLength3, StepKind.NONE, Bounds.NOT_NEGATIVE),
                "sorbed mass is mass on rock");
        return switch (sorption.node().get("isotherm").textValue()) {
            case "linear" -> linear(density);
            case "freundlich" -> freundlich(density);
            default -> langmuir(density);
        };
    }

    private Sorption linear(GriddedValues density) {
        sorption.requireNone(FREUNDLICH, "a linear isotherm");
        sorption.requireNone(LANGMUIR, "a linear isotherm");
        Measure unit = sorption.unit("unit", LITRE_PER_KG, LITRE_PER_KG);
        Optional<GriddedValues> kd = sorption.values("kd", unit, length3PerMass, StepKind.NONE, Bounds.NOT_NEGATIVE);
        if (kd.isPresent()) {
            sorption.requireNone(List.of("koc", "foc"), "\"kd\"");
            return new Sorption.Linear(density, kd.get());
        }
        GriddedValues koc = sorption.required(
                "kd\" or \"koc",
                sorption.values("koc", unit, length3PerMass, StepKind.NONE, Bounds.NOT_NEGATIVE),
                "the isotherm is linear");
        GriddedValues foc = sorption.required("foc", sorption.numbers("foc", Bounds.PART), "Kd is Koc times it");
        return new Sorption.Linear(density, new Product(koc, foc));
    }

    private Sorption freundlich(GriddedValues density) {
        sorption.requireNone(LINEAR, "a Freundlich isotherm");
        sorption.requireNone(LANGMUIR, "a Freundlich isotherm");
        Measure unit = sorption.unit("unit", LITRE_PER_KG, LITRE_PER_KG);
        if (unit.in(LITRE_PER_KG) != 1) {
            throw sorption.fault(
                    "unit", "\"" + unit + "\"", "L/kg", "Give kf for sorbed mass in mg/kg and concentration in mg/L.");
        }
        String why = "the isotherm is Freundlich's";
        return new Sorption.Freundlich(
                density,
                sorption.required("kf", sorption.numbers("kf", Bounds.NOT_NEGATIVE), why),
                sorption.required("n", sorption.numbers("n", Bounds.POSITIVE), why),
                massPerLength3.in(Measure.of("mg/L")));
    }

    private Sorption langmuir(GriddedValues density) {
        sorption.requireNone(LINEAR, "a Langmuir isotherm");
        sorption.requireNone(FREUNDLICH, "a Langmuir isotherm");
        sorption.requireNone(List.of("unit"), "a Langmuir isotherm, whose two values carry their own units");
        String why = "the isotherm is Langmuir's";
        Optional<GriddedValues> capacity = sorption.values(
                "capacity", Measure.of("mg/kg"), Measure.of("kg/kg"), StepKind.NONE, Bounds.NOT_NEGATIVE);
        Optional<GriddedValues> affinity =
                sorption.values("affinity", Measure.of("L/mg"), length3PerMass, StepKind.NONE, Bounds.NOT_NEGATIVE);
        return new Sorption.Langmuir(
                density, sorption.required("capacity", capacity, why), sorption.required("affinity", affinity, why));
    }
}
