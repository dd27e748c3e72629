/** The ledger: a prism's budget as a table of what comes in and goes out. */
package org.seepledger.desktop.ledger;
