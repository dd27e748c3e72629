/** What all panes are made of: a frame that shows one of four states. */
package org.seepledger.desktop.pane;
