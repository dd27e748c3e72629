/** The window's frame: caption, panes, time ribbon, status line with the caution, and the page of all actions. */
package org.seepledger.desktop.shell;
