/**
 * Use cases, one for each command: they read, balance, write, report progress and can be cancelled. An output folder
 * appears whole or not at all.
 */
package org.seepledger.job;
