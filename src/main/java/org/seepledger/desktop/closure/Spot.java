package org.seepledger.desktop.closure;

import org.seepledger.balance.HotSpot;
import org.seepledger.report.CellPlace;

/**
 * A cell that does not balance.
 *
 * @param cell the cell
 * @param place its centre on the map
 * @param where where it is, as users count
 * @param imbalance how much it is out of balance, with its unit
 */
public record Spot(HotSpot cell, CellPlace place, String where, String imbalance) {}
