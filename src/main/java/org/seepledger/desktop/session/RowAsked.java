package org.seepledger.desktop.session;

import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;

/**
 * A row of the selected prism's budget that somebody wants to know more of.
 *
 * @param group its group
 * @param item its item; empty where it adds up all of a group
 * @param layer its layer, from 0; {@link Line#ALL_LAYERS} for all
 */
public record RowAsked(Group group, String item, int layer) {}
