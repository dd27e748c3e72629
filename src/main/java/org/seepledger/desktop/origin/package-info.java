/** Where a number of the ledger comes from: the stored values that it rests on, each with its weight. */
package org.seepledger.desktop.origin;
