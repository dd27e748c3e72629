package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Screen;
import org.seepledger.picture.Profile.Stretch;
import org.seepledger.sketch.Place;

/**
 * A well beside a section's line, put onto it at the nearest place.
 *
 * @param name its name
 * @param along how far along the line, in length units
 * @param away how far it is from the line, in length units
 * @param ground the elevation of the uppermost surface there
 * @param top the upper elevation of its screen or, where only its layer is known, of that layer
 * @param bottom the lower elevation
 */
public record NearbyWell(String name, double along, double away, double ground, double top, double bottom) {

    /**
     * {@return the wells beside a line, in their order}
     *
     * @param aquifer the aquifer
     * @param profile the aquifer along the line
     * @param within how far from the line, in length units
     */
    public static List<NearbyWell> of(Aquifer aquifer, Profile profile, double within) {
        List<NearbyWell> wells = new ArrayList<>();
        for (PlacedWell placed : aquifer.placedWells()) {
            Place place = new Place(placed.well().x(), placed.well().y());
            double nearest = profile.line().nearest(place);
            double away = profile.line().at(nearest).distance(place) * profile.planUnit();
            if (away <= within) {
                double along = nearest * profile.planUnit();
                profile.at(along).ifPresent(stretch -> wells.add(of(placed, along, away, stretch)));
            }
        }
        return wells;
    }

    private static NearbyWell of(PlacedWell placed, double along, double away, Stretch stretch) {
        double[] surfaces = stretch.column().surfaces();
        boolean inLayer = placed.well().screen() instanceof Screen.InLayer;
        double top = inLayer
                ? surfaces[((Screen.InLayer) placed.well().screen()).layer()]
                : ((Screen.Between) placed.well().screen()).top();
        double bottom = inLayer
                ? surfaces[((Screen.InLayer) placed.well().screen()).layer() + 1]
                : ((Screen.Between) placed.well().screen()).bottom();
        return new NearbyWell(placed.well().name(), along, away, surfaces[0], top, bottom);
    }
}
