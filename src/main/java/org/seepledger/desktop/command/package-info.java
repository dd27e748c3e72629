/** Commands as they are typed, to copy from the window. */
package org.seepledger.desktop.command;
