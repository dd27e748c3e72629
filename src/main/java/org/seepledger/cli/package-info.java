/** The command line: parses, shows progress, prints, and turns what happened into an exit status. Computes nothing. */
package org.seepledger.cli;
