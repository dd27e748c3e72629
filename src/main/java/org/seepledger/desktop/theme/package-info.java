/** Light and dark: theme tokens as looked-up colours of the style sheets, switched live. */
package org.seepledger.desktop.theme;
