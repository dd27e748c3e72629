/** The first page: samples, recent folders, and a place to drop a folder; opening, and what went wrong with it. */
package org.seepledger.desktop.welcome;
