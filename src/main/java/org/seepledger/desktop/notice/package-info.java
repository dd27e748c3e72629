/**
 * Notices: what has been done, what to know, what was refused. They block nothing; each leads on by one offer at most, and
 * all are kept in a list that can be opened.
 */
package org.seepledger.desktop.notice;
