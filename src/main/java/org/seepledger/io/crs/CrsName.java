package org.seepledger.io.crs;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.geotools.api.referencing.FactoryException;
import org.geotools.api.referencing.NoSuchAuthorityCodeException;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.referencing.CRS;
import org.geotools.referencing.crs.DefaultGeographicCRS;
import org.seepledger.fault.DataFault;

/** A coordinate reference system as files name it: by code, URN, address or well-known text. */
final class CrsName {

    private static final Pattern CODE = Pattern.compile("(?i)(?:EPSG::?"
            + "|urn:(?:x-)?ogc:def:crs:EPSG:[^:]*:"
            + "|https?://www\\.opengis\\.net/def/crs/EPSG/[^/]+/)0*([1-9]\\d{0,8})");
    private static final Pattern LONGITUDE_LATITUDE = Pattern.compile("(?i)(?:OGC:|CRS:"
            + "|urn:(?:x-)?ogc:def:crs:OGC:[^:]*:"
            + "|https?://www\\.opengis\\.net/def/crs/OGC/[^/]+/)(?:CRS)?84h?");
    private static final Pattern TEXT = Pattern.compile("(?s)\\s*[A-Za-z][A-Za-z_]*\\s*[\\[(].*");
    /** The identifier of the whole in the second version of well-known text: the last thing before its last bracket. */
    private static final Pattern OWN_CODE =
            Pattern.compile("(?s).*,\\s*ID\\s*\\[\\s*\"EPSG\"\\s*,\\s*\"?(\\d{1,9})\"?\\s*\\]\\s*\\]\\s*");

    private static final int LONGEST = 20_000;

    private CrsName() {}

    /** {@return the code that a name stands for, as {@code EPSG:32633}, if it is one} */
    static Optional<String> code(String name) {
        Matcher code = CODE.matcher(name.strip());
        return code.matches() ? Optional.of("EPSG:" + code.group(1)) : Optional.empty();
    }

    /**
     * {@return the system that a name stands for, x or longitude first}
     *
     * @throws DataFault if it stands for none
     */
    static CoordinateReferenceSystem decode(String name, String shownFile, String place) {
        if (LONGITUDE_LATITUDE.matcher(name.strip()).matches()) {
            return DefaultGeographicCRS.WGS84;
        }
        try {
            Optional<String> code = code(name);
            if (code.isPresent()) {
                return lookUp(code.get());
            }
            if (name.length() <= LONGEST && TEXT.matcher(name).matches()) {
                return parse(name);
            }
        } catch (NoSuchAuthorityCodeException e) {
            throw unknown(name, shownFile, place, "");
        } catch (FactoryException | RuntimeException e) {
            throw unknown(name, shownFile, place, " (" + e.getMessage() + ")");
        }
        throw unknown(name, shownFile, place, "");
    }

    private static CoordinateReferenceSystem lookUp(String code) throws FactoryException {
        return CRS.decode(code, true);
    }

    private static CoordinateReferenceSystem parse(String text) throws FactoryException {
        Matcher own = OWN_CODE.matcher(text);
        return own.matches() ? lookUp("EPSG:" + own.group(1)) : CRS.parseWKT(text);
    }

    private static DataFault unknown(String name, String shownFile, String place, String why) {
        String shown = name.length() > 80 ? name.substring(0, 80) + "…" : name;
        return new DataFault(
                shownFile,
                place,
                "\"" + shown + "\", which is not a known CRS" + why,
                "an EPSG code such as \"EPSG:32633\", or well-known text (version 1, or one that ends with its EPSG code)",
                "Write the code of the coordinate reference system that the data are in.");
    }
}
