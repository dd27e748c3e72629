/**
 * What runs beside the window: what it is, how far it is, how long it will take, and a way to stop it. Whatever runs in a
 * {@link org.seepledger.desktop.task.Lane} is shown by itself once it takes long.
 */
package org.seepledger.desktop.running;
