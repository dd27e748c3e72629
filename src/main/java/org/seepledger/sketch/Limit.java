package org.seepledger.sketch;

import java.util.List;
import org.seepledger.aquifer.GriddedValues;

/** The top or bottom of a prism, as it was typed. */
public sealed interface Limit {

    /**
     * The same height everywhere.
     *
     * @param height in length units
     */
    record Elevation(double height) implements Limit {

        /** Refuses what is no height. */
        public Elevation {
            if (!Double.isFinite(height)) {
                throw new Refusal("An elevation is a number.");
            }
        }
    }

    /**
     * The surface of a layer: as a prism's top the layer's top, as its bottom the layer's bottom.
     *
     * @param index which layer, from 0
     */
    record Layer(int index) implements Limit {

        /** Refuses what is no layer anywhere. */
        public Layer {
            if (index < 0) {
                throw new Refusal("Layers count from 1 downward.");
            }
        }

        /**
         * {@return the elevations of that surface}
         *
         * @param layers the grid's layers, from the top down; this one among them
         * @param lid {@code top} or {@code bottom}
         */
        public GriddedValues among(List<org.seepledger.aquifer.Layer> layers, String lid) {
            return lid.equals("top")
                    ? org.seepledger.aquifer.Layer.topOf(layers, index)
                    : org.seepledger.aquifer.Layer.bottomOf(layers, index);
        }
    }

    /**
     * A surface raster.
     *
     * @param path its path, relative to the folder of the file that the drawing is kept in, with {@code /}; whether there
     *     is such a raster shows when the prism is made
     */
    record Surface(String path) implements Limit {}
}
