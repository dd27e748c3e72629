/** What can be done in the window: each action with its words and its shortcut, all on one page. */
package org.seepledger.desktop.action;
