package org.seepledger.aquifer;

import java.util.Optional;

/**
 * One layer.
 *
 * @param name its name
 * @param top its own upper surface, elevations in length units; always there for the uppermost, else empty where it is
 *     the bottom of the layer above
 * @param bottom its lower surface
 * @param waterTable whether the water table can lie in it
 */
public record Layer(String name, Optional<GriddedValues> top, GriddedValues bottom, boolean waterTable) {}
