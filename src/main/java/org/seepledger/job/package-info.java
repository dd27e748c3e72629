/**
 * Use cases, one for each command: strike a balance, inspect a set, trace a row, extract a part. Each reads, lets the
 * engine work, writes, reports progress and can be cancelled. An output file or folder appears whole or not at all.
 */
package org.seepledger.job;
