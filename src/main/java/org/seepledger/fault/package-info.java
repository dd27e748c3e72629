/**
 * What can go wrong, as the person at the keyboard sees it: the data are wrong ({@link
 * org.seepledger.fault.DataFault}), the request is wrong ({@link org.seepledger.fault.UsageFault}), or the program
 * itself is ({@link org.seepledger.fault.ProgramFault}). Each is caught once, at the edge, and shown as one sentence.
 *
 * <p>A leaf: it knows no other package of the project.
 */
package org.seepledger.fault;
