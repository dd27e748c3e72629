package org.seepledger.io.raster;

import java.util.Arrays;

/** Run lengths of bytes (TIFF 6.0, section 9). */
final class PackBits {

    private PackBits() {}

    /** Unpacks until one of the two ends. Returns how many bytes were filled. */
    static int decode(byte[] packed, byte[] target) {
        int in = 0;
        int out = 0;
        while (in + 1 < packed.length && out < target.length) {
            int head = packed[in++];
            if (head >= 0) {
                int run = Math.min(head + 1, Math.min(packed.length - in, target.length - out));
                System.arraycopy(packed, in, target, out, run);
                in += run;
                out += run;
            } else if (head != Byte.MIN_VALUE) {
                int run = Math.min(1 - head, target.length - out);
                Arrays.fill(target, out, out + run, packed[in++]);
                out += run;
            }
        }
        return out;
    }
}
