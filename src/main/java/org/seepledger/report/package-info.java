/** Results in words and tables for people: the answer, summaries for the terminal, and what is found in a set. */
package org.seepledger.report;
