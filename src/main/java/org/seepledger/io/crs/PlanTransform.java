package org.seepledger.io.crs;

import java.util.Optional;
import java.util.function.Consumer;
import org.geotools.api.referencing.FactoryException;
import org.geotools.api.referencing.operation.MathTransform;
import org.geotools.api.referencing.operation.OperationNotFoundException;
import org.geotools.api.referencing.operation.TransformException;
import org.geotools.referencing.CRS;
import org.seepledger.fault.DataFault;

/** The way from the coordinates of a file to plan coordinates. */
public final class PlanTransform {

    private final Optional<MathTransform> steps;
    private final boolean fromDegrees;

    private PlanTransform(Optional<MathTransform> steps, boolean fromDegrees) {
        this.steps = steps;
        this.fromDegrees = fromDegrees;
    }

    /**
     * {@return the way that leaves coordinates as they are}
     */
    public static PlanTransform identity() {
        return new PlanTransform(Optional.empty(), false);
    }

    /**
     * {@return the way from one system to another}
     *
     * @param source the file's system, x or longitude first
     * @param target the plan's
     * @param shownFile the file, for messages
     * @param notes told where no datum shift is known
     * @throws DataFault if there is none
     */
    static PlanTransform between(NamedCrs source, NamedCrs target, String shownFile, Consumer<String> notes) {
        if (CRS.equalsIgnoreMetadata(source.crs(), target.crs())) {
            return identity();
        }
        try {
            return find(source, target, false);
        } catch (OperationNotFoundException e) {
            notes.accept(shownFile + ": no datum shift is known from " + source + " to " + target
                    + "; coordinates were transformed without one and may be off by some hundred metres");
        } catch (FactoryException e) {
            throw noWay(source, target, shownFile);
        }
        try {
            return find(source, target, true);
        } catch (FactoryException e) {
            throw noWay(source, target, shownFile);
        }
    }

    private static PlanTransform find(NamedCrs source, NamedCrs target, boolean lenient) throws FactoryException {
        MathTransform steps = CRS.findMathTransform(source.crs(), target.crs(), lenient);
        return new PlanTransform(Optional.of(steps), source.isInDegrees());
    }

    private static DataFault noWay(NamedCrs source, NamedCrs target, String shownFile) {
        return new DataFault(
                shownFile,
                "crs",
                source + ", from which no way leads to " + target,
                "coordinates that can be transformed to the aquifer's CRS",
                "Reproject the file to the aquifer's CRS.");
    }

    /**
     * {@return whether the coordinates are plan coordinates already, and stay as they are to the last bit}
     */
    public boolean isIdentity() {
        return steps.isEmpty();
    }

    /**
     * {@return whether the coordinates are longitude and latitude in degrees}
     */
    public boolean isFromDegrees() {
        return fromDegrees;
    }

    /**
     * {@return plan x and plan y of a place, both {@code NaN} where the projection does not reach}
     *
     * @param x its x or longitude, in the file's unit
     * @param y its y or latitude
     */
    public double[] apply(double x, double y) {
        double[] place = {x, y};
        if (steps.isEmpty()) {
            return place;
        }
        try {
            steps.get().transform(place, 0, place, 0, 1);
        } catch (TransformException e) {
            return new double[] {Double.NaN, Double.NaN};
        }
        boolean reached = Double.isFinite(place[0]) && Double.isFinite(place[1]);
        return reached ? place : new double[] {Double.NaN, Double.NaN};
    }
}
