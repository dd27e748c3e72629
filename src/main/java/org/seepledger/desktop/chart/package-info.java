/** Gains, losses and storage of the selected prism through time, tied to the interval looked at. */
package org.seepledger.desktop.chart;
