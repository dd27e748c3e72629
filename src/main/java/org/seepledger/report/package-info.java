/** Layout of results for people: the summary on the terminal. */
package org.seepledger.report;
