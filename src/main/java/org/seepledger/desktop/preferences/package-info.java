/** What users want for good: units, theme, size, how numbers are written. Kept from run to run, taken up at once. */
package org.seepledger.desktop.preferences;
