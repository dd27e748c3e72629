package org.seepledger.balance;

/** How errors fall as cells are halved, for tests. */
public final class Refinement {

    private Refinement() {}

    /** The measured order of convergence between the two finest of at least three grids, printed for the reader. */
    public static double order(String what, double... errors) {
        StringBuilder shown = new StringBuilder();
        for (double error : errors) {
            shown.append(String.format(" %.3e", Math.abs(error)));
        }
        double order = Math.log(Math.abs(errors[errors.length - 2] / errors[errors.length - 1])) / Math.log(2);
        System.out.printf("%s: errors%s, order %.2f%n", what, shown, order);
        return order;
    }
}
