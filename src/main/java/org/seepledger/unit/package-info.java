/**
 * Units as they are written in files and options, and exact factors between them (JSR 385); and numbers as people read
 * them.
 *
 * <p>Factors: NIST Handbook 44, Appendix C. A year is 365.25 d. A leaf: it knows no other package of the project.
 */
package org.seepledger.unit;
