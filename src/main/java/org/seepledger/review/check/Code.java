package org.seepledger.review.check;

import java.util.Locale;

/** What a finding is about; what explains most comes first. */
public enum Code {
    /** All terms are in another unit than stated. */
    UNITS(
            "All figures are off by the same factor.",
            "In which unit were the figures worked out, and which does the table state?"),
    /** The numbers are another period's. */
    PERIOD("The figures are those of another period.", "Which dates do the periods begin and end at?"),
    /** The numbers are another area's, or areal terms were taken over another one. */
    AREA("The figures belong to another area.", "Which outline and which area were used?"),
    /** Lateral flow through the whole layer, where its upper part is dry. */
    THICKNESS(
            "Lateral flow was taken through the full thickness of layers that are not full.",
            "Was the saturated thickness used for lateral flow, and from which heads?"),
    /** One term is in another unit. */
    UNIT("A term is off by the ratio of two units.", "In which unit was this term worked out?"),
    /** Storage counts the wrong way. */
    STORAGE_TURNED(
            "Storage counts the wrong way.",
            "Is a rise of the water table a positive or a negative change in storage here?"),
    /** Storage with the wrong coefficient. */
    STORAGE_COEFFICIENT(
            "Storage seems to rest on the wrong coefficient.",
            "Which storage coefficient was used where the layer has a water table?"),
    /** One term counts the wrong way. */
    SIGN("A term counts the wrong way.", "Does this term bring water in or take it out?"),
    /** A term stands twice. */
    TWICE("A term counts twice.", "Is the same water in two rows?"),
    /** A term is not there. */
    MISSING("A term is missing.", "Where is this term booked, or why does it not occur?"),
    /** A well more or less. */
    WELL("A well was counted in or left out.", "Which wells were counted, and where are they?"),
    /** A term was made to close the budget. */
    RESIDUAL_BOOKED(
            "What does not close seems to be booked into a term.",
            "Was this term worked out by itself, or as what was left over?"),
    /** Differences that cancel. */
    COMPENSATING(
            "Terms differ by amounts that cancel, so that the budget closes all the same.",
            "How was each of these terms worked out?"),
    /** A term differs, and no known slip says why. */
    DIFFERENCE(
            "A term differs, and no slip that this review knows explains it.",
            "How was this term worked out, and from which data?"),
    /** Rows do not add to their total. */
    SUM("Rows do not add to their total.", "Which rows make up this total?"),
    /** Totals, storage and residual do not go together. */
    BALANCE(
            "In, out, change in storage and residual do not go together.",
            "How do the residual and the change in storage follow from the totals?"),
    /** Stocks do not carry over. */
    CARRY("What was in storage does not carry over.", "Which stock belongs to which date?"),
    /** Short periods do not make the long one. */
    PARTS(
            "The shorter periods do not make up the longer one.",
            "Are the shorter and the longer periods from the same computation?"),
    /** Rate times duration is not the volume. */
    RATE_VOLUME(
            "Rate times duration is not the volume.",
            "Which of the two was worked out, and how was the other made of it?"),
    /** The closure error does not follow. */
    PERCENT("The stated closure error does not follow from the table.", "What is the closure error a percentage of?"),
    /** Cells were taken whole. */
    WHOLE_CELLS("The figures are those of whole cells along the outline.", "Were cells along the outline taken whole?"),
    /** Wells in cut cells by their cells' area. */
    WELLS_SPREAD("Wells in cells that the outline cuts were counted by area.", "How do wells in cut cells count?"),
    /** Net in place of gross. */
    NET("Flow both ways through a face is given as one net flow.", "None; gross and net flow are both in use."),
    /** Terms put together. */
    GROUPED("A term includes another one.", "Does this term include the other?"),
    /** A year or month of another length. */
    YEAR_LENGTH(
            "Rates and volumes go together with a year or month of slightly another length.",
            "How many days has a year or month here?"),
    /** Beyond rounding, but within tolerance. */
    SLIGHT(
            "Sums are off by more than rounding, and less than the tolerance.",
            "Were the figures rounded more than once?"),
    /** The residual always has the same sign. */
    ONE_SIDED(
            "The residual has the same sign in each period.", "Is there a term that is always too large or too small?"),
    /** The budget closes to nothing. */
    EXACT_CLOSURE("The budget closes exactly.", "Is one of the terms the remainder of the others?"),
    /** The table does not close. */
    NOT_CLOSED(
            "The figures do not add to nothing, and no residual is stated.",
            "What is not known, and where is it stated?"),
    /** A unit that nothing states. */
    UNIT_ASSUMED("No unit is stated.", "In which unit are the figures?"),
    /** Terms that the aquifer does not have. */
    NOT_RECOMPUTED("A term of another compartment was not recomputed.", "None."),
    /** Something that could not be tied. */
    NOT_TIED("Something could not be tied, and was not checked.", "What does this stand for?");

    private final String meaning;
    private final String question;

    Code(String meaning, String question) {
        this.meaning = meaning;
        this.question = question;
    }

    /** {@return what it means, as a sentence} */
    public String meaning() {
        return meaning;
    }

    /** {@return what to ask the author} */
    public String question() {
        return question;
    }

    /** {@return the word for it in files} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
