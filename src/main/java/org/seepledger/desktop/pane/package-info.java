/** What all panes are made of: a frame that shows one of four states, and words that come and go. */
package org.seepledger.desktop.pane;
