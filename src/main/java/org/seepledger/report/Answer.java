package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.seepledger.io.result.MassUnits;

/**
 * What a budget says, in sentences: facts in the order in which a reader asks for them, without a grade.
 *
 * @param prism the prism, or the solute and the prism
 * @param points the sentences, in order
 */
public record Answer(String prism, List<Point> points) {

    /** What a sentence answers. */
    public enum Topic {
        /** How much is there of a solute? */
        HELD("How much is there?"),
        /** How much of that rests on non-detects? */
        UNDETECTED("What rests on non-detects?"),
        /** Does it close? */
        CLOSURE("Does it close?"),
        /** What dominates? */
        DOMINANT("What dominates?"),
        /** What changed in storage? */
        STORAGE("What changed in storage?"),
        /** What goes to and comes from other prisms? */
        EXCHANGE("What do other prisms give and take?"),
        /** Where does a plume go? */
        PATH("Where does it go?"),
        /** Does its mass change? */
        TREND("Does it fall or rise?"),
        /** What can the budget not carry? */
        LIMITS("What can this budget not carry?");

        private final String question;

        Topic(String question) {
            this.question = question;
        }

        /** {@return the question that it answers} */
        public String question() {
            return question;
        }
    }

    /**
     * A sentence or two.
     *
     * @param topic what it answers
     * @param text the words
     */
    public record Point(Topic topic, String text) {}

    /** Copies the list. */
    public Answer {
        points = List.copyOf(points);
    }

    /**
     * {@return what a budget says}
     *
     * @param result the prism's result
     * @param origins what the set states of its terms
     * @param wording how numbers are written
     */
    public static Answer of(PrismResult result, StatedOrigins origins, Wording wording) {
        List<Point> points = new ArrayList<>();
        add(points, Topic.CLOSURE, new ClosureWords(result.budget(), wording).sentences());
        add(points, Topic.DOMINANT, new DominanceWords(result.budget(), wording).sentences());
        add(points, Topic.STORAGE, new StorageWords(result, wording).sentences());
        add(points, Topic.EXCHANGE, new ExchangeWords(result, wording).sentences());
        add(points, Topic.LIMITS, new LimitWords(result, origins, wording).sentences());
        return new Answer(result.prism(), points);
    }

    /**
     * {@return what a solute's budget says}
     *
     * @param result the result for a prism and solute
     * @param units the units to give
     * @param wording how numbers are written, with the units of the budget
     */
    public static Answer of(PlumeResult result, MassUnits units, Wording wording) {
        List<Point> points = new ArrayList<>();
        HoldingWords holding = new HoldingWords(result, units, wording);
        TrendWords trend = new TrendWords(result, units, wording);
        add(points, Topic.HELD, holding.held());
        add(points, Topic.UNDETECTED, holding.undetected());
        add(points, Topic.CLOSURE, new SoluteClosureWords(result, wording).sentences());
        add(points, Topic.DOMINANT, new DominanceWords(result.budget(), wording).sentences());
        add(points, Topic.PATH, trend.path());
        add(points, Topic.TREND, trend.trend());
        add(points, Topic.LIMITS, new SoluteLimitWords(result, wording).sentences());
        return new Answer(result.name(), points);
    }

    private static void add(List<Point> points, Topic topic, List<String> sentences) {
        sentences.forEach(sentence -> points.add(new Point(topic, sentence)));
    }

    /**
     * {@return the sentences on a topic}
     *
     * @param topic the topic
     */
    public Stream<String> on(Topic topic) {
        return points.stream().filter(point -> point.topic() == topic).map(Point::text);
    }
}
