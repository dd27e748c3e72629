package org.seepledger.io.crs;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.api.referencing.crs.GeographicCRS;
import org.geotools.api.referencing.crs.ProjectedCRS;
import org.geotools.referencing.crs.DefaultGeographicCRS;
import org.seepledger.fault.DataFault;
import org.seepledger.unit.Measure;

/** The coordinate reference system of plan coordinates: a projected one, x to the east and y to the north, or local. */
public final class PlanCrs {

    /** Files write the US survey foot with as few as seven digits; the nearest other foot is five times as far away. */
    private static final double SAME_UNIT = 1e-7;

    private static final PlanCrs LOCAL = new PlanCrs(Optional.empty(), Optional.empty(), Double.NaN);

    /**
     * What the libraries have to say is not for users. Kept, since the logging framework forgets the level of a logger
     * that nobody holds.
     */
    private static final Logger[] QUIET = {
        quiet("java.util.prefs", Level.OFF), quiet("org.geotools", Level.SEVERE),
    };

    private final Optional<String> code;
    /** Empty where the system is local, and where it is a known code that nobody had to look up yet. */
    private final Optional<CoordinateReferenceSystem> read;

    private final double metres;

    private PlanCrs(Optional<String> code, Optional<CoordinateReferenceSystem> read, double metres) {
        this.code = code;
        this.read = read;
        this.metres = metres;
    }

    /**
     * {@return the system that a data set names}
     *
     * @param codeOrWkt an EPSG code, its URN or address, or well-known text
     * @param shownFile the file that names it, for messages
     * @param place where in the file
     * @throws DataFault if it is unknown, geographic or not projected, or its axes are not east and north
     */
    public static PlanCrs of(String codeOrWkt, String shownFile, String place) {
        Optional<String> code = CrsName.code(codeOrWkt);
        if (code.filter(PlanCrs::isUtm).isPresent()) {
            return new PlanCrs(code, Optional.empty(), 1);
        }
        return of(CrsName.decode(codeOrWkt, shownFile, place), shownFile, place);
    }

    /**
     * {@return the system that a raster or another library has read}
     *
     * @param crs the system, x first
     * @param shownFile the file that holds it, for messages
     * @param place where in the file
     * @throws DataFault if it is geographic or not projected, or its axes are not east and north
     */
    public static PlanCrs of(CoordinateReferenceSystem crs, String shownFile, String place) {
        NamedCrs named = new NamedCrs(crs);
        if (crs instanceof GeographicCRS) {
            throw new DataFault(
                    shownFile,
                    place,
                    "the geographic CRS " + named,
                    "a projected CRS, since areas in degrees mean nothing",
                    "Reproject the data to a projected CRS, such as the UTM zone that they lie in.");
        }
        if (!(crs instanceof ProjectedCRS)) {
            throw new DataFault(
                    shownFile,
                    place,
                    named + ", which is not a projected CRS",
                    "a projected CRS with two axes",
                    "Name the plan part alone, or null for local coordinates.");
        }
        NamedCrs turned = named.eastNorth(shownFile, place);
        return new PlanCrs(turned.code(), Optional.of(turned.crs()), turned.metres());
    }

    /**
     * {@return plan coordinates of no known place, in the set's length unit}
     */
    public static PlanCrs local() {
        return LOCAL;
    }

    /**
     * {@return whether the coordinates are of no known place}
     */
    public boolean isLocal() {
        return this == LOCAL;
    }

    /**
     * {@return the EPSG code, as {@code EPSG:32633}, where the system has one}
     */
    public Optional<String> code() {
        return code;
    }

    /**
     * {@return what files call the system: its EPSG code, else well-known text; empty when local}
     */
    public Optional<String> name() {
        return isLocal() ? Optional.empty() : code.or(() -> Optional.of(wkt()));
    }

    /**
     * {@return the system as well-known text, version 1; empty when local}
     */
    public String wkt() {
        return isLocal() ? "" : crs().toWKT();
    }

    /**
     * {@return how many length units a plan unit has; exactly 1 when the two are the same}
     *
     * @param lengthUnit the set's length unit
     * @throws IllegalArgumentException if that is not a length
     */
    public double planUnit(Measure lengthUnit) {
        Measure metre = Measure.of("m");
        double inMetres = lengthUnit.in(metre);
        if (isLocal()) {
            return 1;
        }
        for (String known : new String[] {"m", "ft", "ftUS"}) {
            Measure unit = Measure.of(known);
            if (Math.abs(metres / unit.in(metre) - 1) <= SAME_UNIT) {
                return unit.in(lengthUnit);
            }
        }
        return metres / inMetres;
    }

    /**
     * {@return the way from WGS 84, longitude first, to this system}
     *
     * @param shownFile the file whose coordinates are to be transformed, for messages
     * @param notes told where no datum shift is known
     * @throws DataFault if there is no way
     * @throws IllegalStateException if this system is local
     */
    public PlanTransform fromLongitudeLatitude(String shownFile, Consumer<String> notes) {
        return from(DefaultGeographicCRS.WGS84, shownFile, notes);
    }

    /**
     * {@return the way from a system that a file names to this one}
     *
     * @param name an EPSG code, a URN (that of {@code CRS84} too) or address, or well-known text
     * @param shownFile the file whose coordinates are to be transformed, for messages
     * @param place where the file names the system
     * @param notes told where no datum shift is known
     * @throws DataFault if the name is unknown or there is no way
     * @throws IllegalStateException if this system is local
     */
    public PlanTransform from(String name, String shownFile, String place, Consumer<String> notes) {
        if (code.isPresent() && code.equals(CrsName.code(name))) {
            return PlanTransform.identity();
        }
        return from(CrsName.decode(name, shownFile, place), shownFile, notes);
    }

    private PlanTransform from(CoordinateReferenceSystem source, String shownFile, Consumer<String> notes) {
        return PlanTransform.between(new NamedCrs(source), new NamedCrs(crs()), shownFile, notes);
    }

    /**
     * {@return the system for GeoTools}
     *
     * @throws IllegalStateException if it is local
     */
    CoordinateReferenceSystem crs() {
        if (isLocal()) {
            throw new IllegalStateException("local coordinates have no CRS");
        }
        return read.orElseGet(() -> CrsName.decode(code.orElseThrow(), "the EPSG database", ""));
    }

    /** Zones in metres whose codes are laid out regularly: WGS 84, and ETRS89 in Europe. */
    private static boolean isUtm(String code) {
        int number = Integer.parseInt(code.substring(code.indexOf(':') + 1));
        return number > 32600 && number <= 32660
                || number > 32700 && number <= 32760
                || number >= 25828 && number <= 25837;
    }

    private static Logger quiet(String name, Level level) {
        Logger logger = Logger.getLogger(name);
        logger.setLevel(level);
        return logger;
    }
}
