package org.seepledger.io.crs;

import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import javax.measure.Unit;
import javax.measure.quantity.Angle;
import javax.measure.quantity.Length;
import org.geotools.api.referencing.ReferenceIdentifier;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.api.referencing.crs.GeographicCRS;
import org.geotools.api.referencing.cs.AxisDirection;
import org.geotools.api.referencing.cs.CoordinateSystem;
import org.seepledger.fault.DataFault;
import tech.units.indriya.unit.Units;

/**
 * A coordinate reference system of GeoTools, with what is asked of it.
 *
 * @param crs the system
 */
record NamedCrs(CoordinateReferenceSystem crs) {

    private static final Set<AxisDirection> NOT_X =
            Set.of(AxisDirection.WEST, AxisDirection.NORTH, AxisDirection.SOUTH);
    private static final Set<AxisDirection> NOT_Y = Set.of(AxisDirection.WEST, AxisDirection.EAST, AxisDirection.SOUTH);
    private static final double SAME_ANGLE = 1e-9;

    /** {@return the EPSG code, as {@code EPSG:32633}, where it has one} */
    Optional<String> code() {
        return crs.getIdentifiers().stream()
                .filter(id -> "EPSG".equals(id.getCodeSpace()))
                .map(ReferenceIdentifier::getCode)
                .map(number -> "EPSG:" + number)
                .findFirst();
    }

    /** {@return the metres of one unit of a system that measures in lengths} */
    double metres() {
        Unit<Length> unit = unit().asType(Length.class);
        return unit.getConverterTo(Units.METRE).convert(1.0);
    }

    /** {@return whether coordinates are longitude and latitude in degrees} */
    boolean isInDegrees() {
        if (!(crs instanceof GeographicCRS)) {
            return false;
        }
        Unit<Angle> unit = unit().asType(Angle.class);
        double radians = unit.getConverterTo(Units.RADIAN).convert(1.0);
        return Math.abs(Math.toDegrees(radians) - 1) <= SAME_ANGLE;
    }

    private Unit<?> unit() {
        return crs.getCoordinateSystem().getAxis(0).getUnit();
    }

    /**
     * {@return the same system with x to the east and y to the north}
     *
     * <p>Well-known text lists the axes in the authority's order though data keep x first; its code settles it.
     *
     * @throws DataFault if the axes run otherwise
     */
    NamedCrs eastNorth(String shownFile, String place) {
        if (isEastNorth()) {
            return this;
        }
        if (code().isPresent()) {
            NamedCrs turned = new NamedCrs(CrsName.decode(code().get(), shownFile, place));
            if (turned.isEastNorth()) {
                return turned;
            }
        }
        throw new DataFault(
                shownFile,
                place,
                this + ", whose axes run " + direction(0) + " and " + direction(1),
                "x to the east and y to the north",
                "Reproject the data to a CRS whose axes run so, such as the UTM zone that they lie in.");
    }

    /** Round the poles axes run along meridians, neither east nor north; they are taken as x and y. */
    private boolean isEastNorth() {
        CoordinateSystem axes = crs.getCoordinateSystem();
        return axes.getDimension() == 2
                && !NOT_X.contains(axes.getAxis(0).getDirection())
                && !NOT_Y.contains(axes.getAxis(1).getDirection());
    }

    private String direction(int axis) {
        AxisDirection direction = crs.getCoordinateSystem().getAxis(axis).getDirection();
        return direction.name().toLowerCase(Locale.ROOT);
    }

    /** {@return name and code for a message} */
    @Override
    public String toString() {
        return "\"" + crs.getName().getCode() + "\""
                + code().map(code -> " (" + code + ")").orElse("");
    }
}
