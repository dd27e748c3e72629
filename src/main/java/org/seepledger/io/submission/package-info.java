/**
 * Budgets that somebody else submitted, as text or as a workbook, and what a review writes: findings, the mapping that it
 * went by, the figures beside the recomputed ones, and how two runs differ.
 *
 * <p>Text is CSV as in RFC 4180, or with semicolons or tabs; UTF-8, or else the western code page 1252. A workbook is a
 * SpreadsheetML one (ISO/IEC 29500-1), read by streams with stated limits: nothing in it is run, and nothing outside it is
 * opened.
 */
package org.seepledger.io.submission;
