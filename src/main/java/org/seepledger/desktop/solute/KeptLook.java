package org.seepledger.desktop.solute;

import java.util.Arrays;
import org.seepledger.desktop.port.Settings;
import org.seepledger.job.PlumeRequest.Threshold;

/** Keeps from run to run how solutes are looked at; which one is looked at belongs to the set, and begins with water. */
public final class KeptLook {

    private static final String THRESHOLD = "solute.threshold";
    private static final String DISPERSION = "solute.dispersion";
    private static final String TRACK = "solute.track";

    private KeptLook() {}

    /**
     * Takes up what is kept, and keeps what changes.
     *
     * @param look how solutes are looked at
     * @param settings where it is kept
     */
    public static void of(SoluteLook look, Settings settings) {
        settings.get(THRESHOLD).ifPresent(look::type);
        look.dispersion().set(settings.get(DISPERSION).filter("true"::equals).isPresent());
        settings.get(TRACK)
                .flatMap(kept -> Arrays.stream(SoluteLook.Track.values())
                        .filter(track -> track.name().equals(kept))
                        .findFirst())
                .ifPresent(look.track()::set);
        look.threshold()
                .addListener((threshold, before, after) ->
                        settings.put(THRESHOLD, after.map(Threshold::toString).orElse("")));
        look.dispersion().addListener((dispersion, before, after) -> settings.put(DISPERSION, String.valueOf(after)));
        look.track().addListener((track, before, after) -> settings.put(TRACK, after.name()));
    }
}
