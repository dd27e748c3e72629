/** What the selected prism's budget says in sentences, and where on the map it does not close. */
package org.seepledger.desktop.closure;
