package org.seepledger.picture;

/** Moves labels along a line as little as it takes for none to touch the next, by pooling neighbours (Ayer et al. 1955). */
final class Spread {

    private Spread() {}

    /**
     * {@return where the middles come to, each at least {@code apart} from the next}
     *
     * @param wanted where they would best be, in rising order
     * @param apart how far they must be apart
     * @param from the least place of a middle
     * @param to the greatest; where they do not all fit in, the last come to lie beyond it
     */
    static double[] out(double[] wanted, double apart, double from, double to) {
        int count = wanted.length;
        double[] mean = new double[count];
        int[] size = new int[count];
        int pools = 0;
        for (int i = 0; i < count; i++) {
            mean[pools] = wanted[i] - i * apart;
            size[pools++] = 1;
            while (pools > 1 && mean[pools - 2] > mean[pools - 1]) {
                int joined = size[pools - 2] + size[pools - 1];
                mean[pools - 2] = (mean[pools - 2] * size[pools - 2] + mean[pools - 1] * size[pools - 1]) / joined;
                size[--pools - 1] = joined;
            }
        }
        double last = Math.max(from, to - Math.max(0, count - 1) * apart);
        double[] places = new double[count];
        for (int pool = 0, i = 0; pool < pools; pool++) {
            for (int end = i + size[pool]; i < end; i++) {
                places[i] = Math.max(from, Math.min(last, mean[pool])) + i * apart;
            }
        }
        return places;
    }
}
