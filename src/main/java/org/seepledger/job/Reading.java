package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.fault.DataFault;
import org.seepledger.io.submission.SubmissionFile;
import org.seepledger.review.check.Beside;
import org.seepledger.review.check.Reference;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.ValueTies;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Figures;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.MappingGuess;
import org.seepledger.review.mapping.Submission;
import org.seepledger.review.mapping.Tie;
import org.seepledger.review.sheet.Numerals;
import org.seepledger.review.sheet.Sheet;

/** Reads a submission by a guess, with a person's corrections over it. */
final class Reading {

    private final Path file;
    private final Optional<Mapping> corrections;
    private final Optional<Reference> reference;
    private final int waterYearStart;

    private Reading(Path file, Optional<Mapping> corrections, Optional<Reference> reference, int waterYearStart) {
        this.file = file;
        this.corrections = corrections;
        this.reference = reference;
        this.waterYearStart = waterYearStart;
    }

    /**
     * The tables of a file.
     *
     * @param file the file
     * @param corrections corrections to the guess
     * @param reference what there is to tie to; empty for nothing
     * @param waterYearStart the month in which a water year begins
     * @throws DataFault if the file cannot be read, or holds no table
     */
    static List<Submission> of(
            Path file, Optional<Mapping> corrections, Optional<Reference> reference, int waterYearStart) {
        return new Reading(file, corrections, reference, waterYearStart).read();
    }

    private List<Submission> read() {
        Catalogue catalogue = reference.map(Reference::catalogue).orElse(Catalogue.EMPTY);
        List<Submission> tables = new ArrayList<>();
        for (Sheet sheet : SubmissionFile.read(file, file.toString())) {
            table(sheet, catalogue).filter(table -> !table.figures().isEmpty()).ifPresent(tables::add);
        }
        if (tables.isEmpty()) {
            throw new DataFault(
                    file.toString(),
                    "",
                    "no table of a budget",
                    "a line of headings with numbers below it",
                    "Give terms and periods headings, or put the table into the columns of budget.csv.");
        }
        return tables;
    }

    private Optional<Submission> table(Sheet sheet, Catalogue catalogue) {
        Optional<Character> decimal = corrections.flatMap(Mapping::decimal);
        Numerals numerals = decimal.map(Numerals::with).orElseGet(() -> Numerals.of(sheet));
        Optional<Submission> read = table(sheet, catalogue, numerals);
        if (!numerals.guessed() || reference.isEmpty()) {
            return read;
        }
        Optional<Submission> other = table(sheet, catalogue, Numerals.with('.'));
        return agreeing(other) > agreeing(read) ? other : read;
    }

    /** How many figures agree: it tells what a comma means where nothing else does. */
    private long agreeing(Optional<Submission> table) {
        return table.map(one -> Review.of(List.of(one), reference, 1)).stream()
                .flatMap(result -> result.beside().stream())
                .filter(Beside::agrees)
                .count();
    }

    private Optional<Submission> table(Sheet sheet, Catalogue catalogue, Numerals numerals) {
        return MappingGuess.of(sheet, catalogue, numerals, waterYearStart, corrections)
                .map(mapping -> Figures.of(sheet, mapping, catalogue, waterYearStart))
                .map(table -> byValue(sheet, table, catalogue));
    }

    /** Terms that words do not tell are tied by value, unless a person has spoken. */
    private Submission byValue(Sheet sheet, Submission table, Catalogue catalogue) {
        if (reference.isEmpty()) {
            return table;
        }
        Map<String, String> areas = Review.areas(List.of(table), catalogue);
        List<Figure> figures = table.figures();
        Map<String, Tie> ties = new LinkedHashMap<>(ValueTies.of(figures, areas, reference.get()));
        corrections.ifPresent(given -> ties.keySet().removeAll(given.terms().keySet()));
        if (ties.isEmpty()) {
            return table;
        }
        Mapping found = table.mapping();
        Map<String, Tie> terms = new LinkedHashMap<>(found.terms());
        terms.putAll(ties);
        Mapping mapping = new Mapping(
                found.header(), found.decimal(), found.unit(), found.columns(), terms, found.areas(), found.periods());
        return Figures.of(sheet, mapping, catalogue, waterYearStart);
    }
}
