/**
 * What the features share: the open aquifer, what is drawn on it, which interval, layer, prism and face are looked at.
 * Features meet here alone.
 */
package org.seepledger.desktop.session;
