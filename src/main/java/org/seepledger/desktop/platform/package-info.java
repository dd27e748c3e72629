/** What the window asks of the machine, asked of the real one. */
package org.seepledger.desktop.platform;
