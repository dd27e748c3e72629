package org.seepledger.balance;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.ledger.Account;
import org.seepledger.prism.PrismCut;

/**
 * The walk along the pieces, lids and cells of one prism, in the order and with the weights of its water budget, for whoever
 * books there what the water carries.
 */
public final class PrismWalk {

    private final PrismAccounts prism;

    /**
     * Prepares the walk of a prism.
     *
     * @param aquifer the aquifer
     * @param cut how the prism cuts its grid
     * @param wells the wells in the window of the work
     * @param rule how wells in cut cells count
     * @throws org.seepledger.fault.DataFault if the prism lies in no layer
     */
    public PrismWalk(Aquifer aquifer, PrismCut cut, List<PlacedWell> wells, WellRule rule) {
        this.prism = new PrismAccounts(aquifer, cut, wells, rule);
    }

    /** {@return how the prism cuts the grid} */
    public PrismCut cut() {
        return prism.cut();
    }

    /** {@return the accounts of the water budget, as bookings number them} */
    public List<Account> accounts() {
        return prism.chart().accounts();
    }

    /** {@return the first layer of the prism's range, from 0} */
    public int firstLayer() {
        return prism.chart().first();
    }

    /** {@return the number of layers in the prism's range} */
    public int layers() {
        return prism.chart().layers();
    }

    /**
     * {@return the walk over one band of rows}
     *
     * @param geometry the cells of the band with the ring around them
     */
    public OverBand over(CellGeometry geometry) {
        return new OverBand(prism, prism.elevations(geometry.block().window()));
    }

    /** The walk over one band of rows, which may be gone again and again. */
    public static final class OverBand {

        private final PrismAccounts prism;
        private final Optional<Elevations> elevations;

        private OverBand(PrismAccounts prism, Optional<Elevations> elevations) {
            this.prism = prism;
            this.elevations = elevations;
        }

        /**
         * Books what the band holds of the prism in one interval.
         *
         * @param state flows, terms and wells of the interval
         * @param bookings takes them
         */
        public void book(IntervalState state, Bookings bookings) {
            prism.book(state, prism.slab(state, elevations), bookings);
        }
    }
}
