/** How large everything in the window is. */
package org.seepledger.desktop.size;
