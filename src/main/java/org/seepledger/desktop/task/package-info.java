/**
 * Work beside the window: on daemon threads, with stale work cancelled, and answers on the window's own thread.
 *
 * <p>Whatever reads files or lets the engine work begins with {@link org.seepledger.desktop.task.EntryGuard#enter}. Tests
 * put in tasks that run at once.
 */
package org.seepledger.desktop.task;
