package org.seepledger.picture;

import java.util.List;

/** Round values along an axis or a scale, with what is written beside them. */
public sealed interface RoundValues permits Ticks, LogTicks {

    /** {@return how many there are} */
    int count();

    /** {@return their values} */
    List<Double> values();

    /**
     * {@return how one is written}
     *
     * @param index which, from 0
     */
    String label(int index);
}
