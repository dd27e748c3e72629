/** What the window asks of the machine, as interfaces, so that tests can give any answer. */
package org.seepledger.desktop.port;
