package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.picture.Body;
import org.seepledger.picture.NearbyWell;
import org.seepledger.picture.Picture;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionLine;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** The part of a {@link Workbench} that reads what maps and sections show. */
public final class ViewBench {

    private final Workbench set;
    private final Gate gate;

    ViewBench(Workbench set, Gate gate) {
        this.set = set;
        this.gate = gate;
    }

    /**
     * {@return what a map can show of the set}
     *
     * @throws Cancelled if the workbench was closed
     */
    public List<MapQuantity> quantities() {
        gate.mustBeOpen();
        return reading(Progress.NONE).quantities();
    }

    /**
     * Reads what a map shows of one layer.
     *
     * @param quantity one of {@link #quantities()}
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     * @param window the cells
     * @param stride how many cells make one value along each side, at least 1
     * @param progress told how far the work is
     * @return the values
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public GridLayer layer(
            MapQuantity quantity, int layer, int interval, Window window, int stride, Progress progress) {
        return gate.ask(progress, until -> reading(until).layer(quantity, layer, interval, window, stride));
    }

    /**
     * Reads horizontal flux for arrows on a map.
     *
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     * @param window the cells
     * @param stride how many cells make one arrow along each side, at least 1
     * @param progress told how far the work is
     * @return the field
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public FluxField flux(int layer, int interval, Window window, int stride, Progress progress) {
        return gate.ask(progress, until -> reading(until).flux(layer, interval, window, stride));
    }

    /**
     * {@return the wells, in the order in which the set names them}
     *
     * @param interval the interval that rates are for, from 0
     */
    public List<WellPlace> wells(int interval) {
        return WellPlace.of(set.aquifer(), interval);
    }

    /**
     * {@return a picture that lies under the map}
     *
     * @param file a GeoTIFF in the aquifer's coordinate system
     * @param progress told how far the reading is
     * @throws org.seepledger.fault.DataFault if it cannot be read, or lies in another system
     */
    public GroundPicture ground(Path file, Progress progress) {
        return gate.ask(progress, until -> GroundPicture.read(file, set.crs(), until));
    }

    /**
     * {@return a map on paper of what a view shows}
     *
     * @param asked what it is to show
     * @param progress told how far the work is
     * @throws org.seepledger.fault.DataFault if the data are wrong, or the selected prism has no budget
     * @throws Cancelled if the work was stopped
     */
    public Picture map(MapAsked asked, Progress progress) {
        return new MapOnPaper(set, asked, progress).drawn();
    }

    /**
     * Cuts the aquifer along a line.
     *
     * @param line the line
     * @param quantity one of {@link #quantities()}, to be shown as colour; empty for none
     * @param interval the interval, from 0, whose begin and end water levels are those of
     * @param progress told how far the reading is
     * @return what stands along it; nothing where it lies off the grid
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public Profile profile(SectionLine line, Optional<MapQuantity> quantity, int interval, Progress progress) {
        Optional<Profile.LayerValues> values = quantity.map(
                shown -> (layer, window) -> reading(Progress.NONE).cells(shown, layer, interval, window)[0]);
        return gate.ask(progress, until -> Profile.along(line, set.aquifer(), interval, interval + 1, values, until));
    }

    /**
     * Puts prisms and wells into a section; quick, so that it follows prisms while they are drawn.
     *
     * @param profile what stands along its line
     * @param prisms the prisms as they are drawn, even beyond the grid
     * @param within how far from the line wells are shown, in length units
     * @param progress told how far the work is
     * @return the section, without colours, and with nothing standing out
     * @throws org.seepledger.fault.DataFault if a prism's surface cannot be read
     * @throws Cancelled if the work was stopped
     */
    public Section section(Profile profile, List<Prism> prisms, double within, Progress progress) {
        return gate.ask(progress, until -> {
            List<Body> bodies = new ArrayList<>();
            for (Prism prism : prisms) {
                until.step();
                bodies.add(Body.of(prism, profile));
            }
            boolean moves = set.aquifer().head().filter(GriddedValues::changes).isPresent();
            return new Section(
                    profile,
                    set.aquifer().layers(),
                    set.aquifer().lengthUnit().toString(),
                    moves ? Optional.of("interval") : Optional.empty(),
                    bodies,
                    NearbyWell.of(set.aquifer(), profile, within),
                    within,
                    Optional.empty(),
                    Section.Light.NONE);
        });
    }

    private LayerReading reading(Progress progress) {
        return new LayerReading(set.aquifer(), set.solutes().solutes(), progress);
    }
}
