/** Handing over: what is wanted of the prisms drawn, where it goes, and the commands that do the same. */
package org.seepledger.desktop.handover;
