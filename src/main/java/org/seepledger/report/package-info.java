/** Layout of results for people: on the terminal, the summary of a balance and what is found in a set. */
package org.seepledger.report;
