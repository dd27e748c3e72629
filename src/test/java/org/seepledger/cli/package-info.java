/** Commands from end to end: small data sets written, run as a user runs them, and what comes out read by other means. */
package org.seepledger.cli;
