package org.seepledger.plume;

/** What makes a solute's numbers doubtful, as found cell by cell. */
public final class Doubts {

    private double fastestDecay;
    private double widestHalfCell;
    private double shortestDispersivity = Double.POSITIVE_INFINITY;
    private long drainsMoreThanPores;

    void addDecay(double inInterval) {
        fastestDecay = Math.max(fastestDecay, inInterval);
    }

    void addDispersivity(double halfCell, double longitudinal) {
        widestHalfCell = Math.max(widestHalfCell, halfCell);
        shortestDispersivity = longitudinal < shortestDispersivity ? longitudinal : shortestDispersivity;
    }

    void addDrainsMoreThanPores() {
        drainsMoreThanPores++;
    }

    void add(Doubts other) {
        fastestDecay = Math.max(fastestDecay, other.fastestDecay);
        addDispersivity(other.widestHalfCell, other.shortestDispersivity);
        drainsMoreThanPores += other.drainsMoreThanPores;
    }

    /** {@return the greatest decay rate times an interval's length} */
    public double fastestDecay() {
        return fastestDecay;
    }

    /** {@return half the longer side of the largest cell, in length units: what the upstream rule spreads like} */
    public double widestHalfCell() {
        return widestHalfCell;
    }

    /** {@return the least longitudinal dispersivity given, in length units; infinite where none is} */
    public double shortestDispersivity() {
        return shortestDispersivity;
    }

    /** {@return how often a cell drained more water than its pores can hold: specific yield above porosity} */
    public long drainsMoreThanPores() {
        return drainsMoreThanPores;
    }
}
