/**
 * Use cases, one for each command, for the import of loose files and for handing over. Each reads, lets the engine work,
 * writes, reports progress and can be cancelled. An output file or folder appears whole or not at all.
 *
 * <p>The {@link org.seepledger.job.Workbench} serves a window rather than a command: it keeps a set open and answers many
 * questions about it, by itself and by its parts.
 */
package org.seepledger.job;
