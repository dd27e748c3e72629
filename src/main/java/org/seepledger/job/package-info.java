/**
 * Use cases, one for each command: strike a balance, inspect a set, trace a row, extract a part. Each reads, lets the
 * engine work, writes, reports progress and can be cancelled. An output file or folder appears whole or not at all.
 *
 * <p>The {@link org.seepledger.job.Workbench} serves a window rather than a command: it keeps a set open and answers many
 * questions about it.
 */
package org.seepledger.job;
