package org.seepledger.intake;

import java.util.Optional;
import org.seepledger.aquifer.Grid;

/**
 * The grid that files lie on.
 *
 * @param grid the grid, in map units; empty if nothing tells it
 * @param reason what tells it, as a sentence
 */
public record FoundGrid(Optional<Grid> grid, String reason) {}
