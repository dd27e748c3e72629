package org.seepledger.desktop;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;

/**
 * Writes pictures with 256 colours, which the eye does not tell from the original where most of it is paper, letters and one
 * ramp: boxes of colours are halved at their median until there are as many (Heckbert 1982), and each pixel takes its box's mean.
 */
final class IndexedPng {

    private static final int COLOURS = 256;

    private IndexedPng() {}

    /** A box of colours, with how often each occurs. */
    private record Box(List<int[]> colours) {

        /** Red, green and blue, 16, 8 or 0 bits up: the one that spreads most. */
        int widest() {
            int widest = 0;
            int spread = -1;
            for (int shift : new int[] {16, 8, 0}) {
                var channel = colours.stream()
                        .mapToInt(colour -> colour[0] >> shift & 255)
                        .summaryStatistics();
                if (channel.getMax() - channel.getMin() > spread) {
                    spread = channel.getMax() - channel.getMin();
                    widest = shift;
                }
            }
            return widest;
        }

        /** How much is seen of the box being one colour: its spread, and how many pixels it has. */
        double weight() {
            int shift = widest();
            var channel = colours.stream()
                    .mapToInt(colour -> colour[0] >> shift & 255)
                    .summaryStatistics();
            double spread = channel.getMax() - channel.getMin();
            return spread * spread * Math.sqrt(count());
        }

        private long count() {
            return colours.stream().mapToLong(colour -> colour[1]).sum();
        }

        List<Box> halved() {
            int shift = widest();
            colours.sort(Comparator.comparingInt(colour -> colour[0] >> shift & 255));
            int middle = colours.size() / 2;
            return List.of(
                    new Box(new ArrayList<>(colours.subList(0, middle))),
                    new Box(new ArrayList<>(colours.subList(middle, colours.size()))));
        }

        int mean() {
            int mean = 0;
            long all = count();
            for (int shift : new int[] {16, 8, 0}) {
                long sum = colours.stream()
                        .mapToLong(colour -> (long) colour[1] * (colour[0] >> shift & 255))
                        .sum();
                mean |= (int) Math.round((double) sum / all) << shift;
            }
            return mean;
        }
    }

    static void write(int[] argb, int width, int height, Path file) throws IOException {
        Map<Integer, int[]> counted = new HashMap<>();
        for (int pixel : argb) {
            counted.computeIfAbsent(pixel & 0xffffff, colour -> new int[] {colour, 0})[1]++;
        }
        List<Box> boxes = boxes(new ArrayList<>(counted.values()));
        byte[][] palette = new byte[3][boxes.size()];
        Map<Integer, Integer> places = new HashMap<>();
        for (int i = 0; i < boxes.size(); i++) {
            int mean = boxes.get(i).mean();
            palette[0][i] = (byte) (mean >> 16);
            palette[1][i] = (byte) (mean >> 8);
            palette[2][i] = (byte) mean;
            for (int[] colour : boxes.get(i).colours()) {
                places.put(colour[0], i);
            }
        }
        IndexColorModel colours = new IndexColorModel(8, boxes.size(), palette[0], palette[1], palette[2]);
        BufferedImage picture = new BufferedImage(width, height, BufferedImage.TYPE_BYTE_INDEXED, colours);
        int[] pixels = new int[argb.length];
        for (int i = 0; i < argb.length; i++) {
            pixels[i] = places.get(argb[i] & 0xffffff);
        }
        picture.getRaster().setPixels(0, 0, width, height, pixels);
        ImageIO.write(picture, "png", file.toFile());
    }

    private static List<Box> boxes(List<int[]> colours) {
        List<Box> boxes = new ArrayList<>(List.of(new Box(colours)));
        while (boxes.size() < COLOURS) {
            Box widest = boxes.stream()
                    .filter(box -> box.colours().size() > 1)
                    .max(Comparator.comparingDouble(Box::weight))
                    .orElse(null);
            if (widest == null) {
                return boxes;
            }
            boxes.remove(widest);
            boxes.addAll(widest.halved());
        }
        return boxes;
    }
}
