/** What prisms give to each other: as a matrix and as a diagram of flows. */
package org.seepledger.desktop.exchange;
