/**
 * Readers and writers: what stands between the files of a user and the records of the engine.
 *
 * <p>Each kind of file has a package of its own below this one; here are the things that they share. Whatever is wrong
 * in a file comes out as a {@link org.seepledger.fault.DataFault}, and sizes are held against stated limits before
 * memory is taken for them. The only place that knows GeoTools, Jackson and Commons CSV.
 */
package org.seepledger.io;
