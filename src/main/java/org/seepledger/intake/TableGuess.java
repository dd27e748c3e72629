package org.seepledger.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.intake.Guess.Confidence;
import org.seepledger.io.table.TableLook;

/** Guesses what a table is. */
final class TableGuess {

    private TableGuess() {}

    static Item.Table of(LooseFile.Table file) {
        TableLook look = file.look();
        return of(file, Columns.of(look), Columns.arePoints(look));
    }

    /** The table with other places; what is made of columns that stay columns of values is kept. */
    static Item.Table with(Item.Table table, List<Place> places) {
        boolean placed = places.contains(Place.X) && places.contains(Place.Y);
        boolean points = placed && (places.contains(Place.RATE) || places.contains(Place.VOLUME));
        Item.Table fresh = of(table.file(), places, points);
        List<Use> uses = new ArrayList<>();
        for (Use use : fresh.uses()) {
            uses.add(table.uses().stream()
                    .filter(old -> old.column() == use.column())
                    .findFirst()
                    .orElse(use));
        }
        return new Item.Table(table.file(), places, uses);
    }

    private static Item.Table of(LooseFile.Table file, List<Place> places, boolean points) {
        if (points) {
            return new Item.Table(file, places, List.of(points(file, places)));
        }
        List<Use> uses = new ArrayList<>();
        long values = places.stream().filter(place -> place == Place.VALUE).count();
        for (int column = 0; column < places.size(); column++) {
            if (places.get(column) == Place.VALUE) {
                uses.add(column(file, column, values == 1));
            }
        }
        return new Item.Table(file, places, uses);
    }

    private static Use points(LooseFile.Table file, List<Place> places) {
        int amount = places.indexOf(places.contains(Place.RATE) ? Place.RATE : Place.VOLUME);
        TableLook.Column column = file.look().columns().get(amount);
        String stem = stem(file.shownName());
        boolean takes = !(column.least() < 0);
        String reason = "Lines with coordinates and a rate are points, such as wells; "
                + Wording.range(column.least(), column.greatest()) + "."
                + (takes ? " Wells are taken to take water, so the sign is turned." : "");
        String name = Vocabulary.words(stem).contains("injection") ? "injection" : "pumping";
        boolean turned = takes && !name.equals("injection");
        Role.Amount measured = places.contains(Place.RATE) ? Role.Amount.FLOW : Role.Amount.NOTHING;
        String unit = column.unit().isEmpty()
                ? UnitGuess.of(column.heading(), measured).orElse("")
                : UnitGuess.read(column.unit(), measured).orElse("");
        return new Use(-1, "", Role.POINTS, name, unit, 0, turned, new Guess(Role.POINTS, Confidence.HIGH, reason));
    }

    /** A heading says more than the file's name, which counts where it is the only column or the heading says nothing. */
    private static Use column(LooseFile.Table file, int index, boolean alone) {
        TableLook.Column column = file.look().columns().get(index);
        String stem = stem(file.shownName());
        String text = Vocabulary.withoutUnit(column.name());
        Guess guess = RoleGuess.of(text, column.least(), column.greatest());
        boolean concentrations = column.limits() > 0
                || Vocabulary.of(stem)
                        .filter(said -> said.role() == Role.CONCENTRATION)
                        .isPresent();
        if (guess.role() == Role.NONE && alone) {
            guess = RoleGuess.of(stem, column.least(), column.greatest());
            text = guess.role() == Role.CONCENTRATION ? text : stem;
        } else if (guess.role() == Role.NONE && concentrations) {
            String why =
                    column.limits() > 0 ? "Some cells give a limit with <" : "The file's name speaks of concentrations";
            guess = new Guess(
                    Role.CONCENTRATION,
                    Confidence.FAIR,
                    why + "; " + Wording.range(column.least(), column.greatest()) + ".");
        }
        Use use = UseGuess.of(index, column.name(), text, guess, column.least(), column.greatest(), unit(column));
        boolean fromFile = use.role().isSource()
                && Vocabulary.of(stem).filter(said -> said.role() == use.role()).isPresent();
        return fromFile ? use.withName(Wording.name(use.role(), stem)) : use;
    }

    private static Optional<String> unit(TableLook.Column column) {
        return column.unit().isEmpty() ? Optional.empty() : Optional.of(column.unit());
    }

    private static String stem(String shownName) {
        String name = shownName.substring(shownName.lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        return dot < 0 ? name : name.substring(0, dot);
    }
}
