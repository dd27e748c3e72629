/**
 * The window: a package per feature, each a view and its view model. {@link org.seepledger.desktop.Desktop} opens it.
 *
 * <p>A view builds nodes and binds; a view model has properties and commands and knows no scene. Whatever reads files or
 * lets the engine work runs through {@code task}, never on the window's own thread. Features meet in {@code session}
 * alone. Nothing is computed here.
 */
package org.seepledger.desktop;
