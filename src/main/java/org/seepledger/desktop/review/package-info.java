/**
 * The review of a submitted budget: what was read and what it is tied to, what was found, and where that stands on the map
 * and in the ledger. The prisms are those drawn, as they are shown.
 */
package org.seepledger.desktop.review;
