/**
 * The plain progress-and-cancel interface that long work reports to, whoever shows it.
 *
 * <p>A leaf: it knows no other package of the project.
 */
package org.seepledger.progress;
