package org.seepledger.picture;

/**
 * An upright rectangle in a picture, in logical pixels.
 *
 * @param x its left edge
 * @param y its upper edge
 * @param width how wide it is
 * @param height how high it is
 */
public record Box(double x, double y, double width, double height) {

    /** {@return its right edge} */
    public double right() {
        return x + width;
    }

    /** {@return its lower edge} */
    public double bottom() {
        return y + height;
    }

    /** {@return the x of its middle} */
    public double middleX() {
        return x + width / 2;
    }

    /** {@return the y of its middle} */
    public double middleY() {
        return y + height / 2;
    }

    /**
     * {@return a rectangle within this one}
     *
     * @param margin by how much each edge is moved inwards
     */
    public Box inset(double margin) {
        return new Box(x + margin, y + margin, width - 2 * margin, height - 2 * margin);
    }

    /**
     * {@return whether the two have more than edges in common}
     *
     * @param other the other
     */
    public boolean meets(Box other) {
        return x < other.right() && other.x < right() && y < other.bottom() && other.y < bottom();
    }

    /**
     * {@return whether the other lies within this one}
     *
     * @param other the other
     */
    public boolean holds(Box other) {
        return other.x >= x && other.right() <= right() && other.y >= y && other.bottom() <= bottom();
    }

    /** {@return its corners, x and y in turn} */
    public double[] ring() {
        return new double[] {x, y, right(), y, right(), bottom(), x, bottom()};
    }
}
