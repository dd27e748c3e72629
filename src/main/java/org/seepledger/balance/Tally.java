package org.seepledger.balance;

import org.seepledger.fault.ProgramFault;

/**
 * The running sums of one prism, or of one contact of two, in one interval: gross rates by account, both routes to a
 * prism's net outflow, and the area of its cells that take no part.
 */
public final class Tally implements Bookings {

    private static final int FACES = 0;
    private static final int VOLUME = 1;
    private static final int GROSS = 2;

    private final Sums inflow;
    private final Sums outflow;
    private final Sums routes = new Sums(3);
    private final Sums inactiveArea;

    /**
     * Makes an empty one.
     *
     * @param accounts how many accounts
     * @param layers how many layers
     */
    public Tally(int accounts, int layers) {
        inflow = new Sums(accounts);
        outflow = new Sums(accounts);
        inactiveArea = new Sums(layers);
    }

    @Override
    public void at(int row, int column) {
        // Sums are the same wherever something is booked.
    }

    /** In and out apart, and the same to the last bit seen from the other side. */
    @Override
    public void throughPiece(int account, double start, double end) {
        double net = 0.5 * (start + end);
        routes.add(FACES, net);
        if (start >= 0 && end >= 0) {
            outflow.add(account, net);
        } else if (start <= 0 && end <= 0) {
            inflow.add(account, -net);
        } else {
            double before = 0.5 * start * (start / (start - end));
            double after = 0.5 * end * (end / (end - start));
            outflow.add(account, Math.max(before, after));
            inflow.add(account, -Math.min(before, after));
        }
    }

    @Override
    public void throughFace(int account, double out) {
        routes.add(FACES, out);
        (out >= 0 ? outflow : inflow).add(account, Math.abs(out));
    }

    @Override
    public void added(int account, double rate) {
        (rate >= 0 ? inflow : outflow).add(account, Math.abs(rate));
    }

    @Override
    public void fromVolume(double out, double gross) {
        routes.add(VOLUME, out);
        routes.add(GROSS, gross);
    }

    @Override
    public void inactive(int layer, double area) {
        inactiveArea.add(layer, area);
    }

    /**
     * Adds another one's sums.
     *
     * @param other of as many accounts and layers
     */
    public void add(Tally other) {
        inflow.add(other.inflow);
        outflow.add(other.outflow);
        routes.add(other.routes);
        inactiveArea.add(other.inactiveArea);
    }

    /** {@return gross inflow by account} */
    public double[] inflow() {
        return inflow.toArray();
    }

    /** {@return gross outflow by account} */
    public double[] outflow() {
        return outflow.toArray();
    }

    double[] inactiveArea() {
        return inactiveArea.toArray();
    }

    /** The difference between the two routes as a share of the gross flow; 0 where nothing flows. */
    double disagreement() {
        double difference = Math.abs(routes.get(FACES) - routes.get(VOLUME));
        return difference == 0 ? 0 : difference / routes.get(GROSS);
    }

    /** Makes sure that both routes came to the same. */
    void check(String prism, int interval, double allowed) {
        if (!(disagreement() <= allowed)) {
            throw new ProgramFault("Outflow through the faces of prism \"" + prism + "\" in interval " + (interval + 1)
                    + " is " + routes.get(FACES) + ", but the integral over its volume is " + routes.get(VOLUME) + ".");
        }
    }
}
