package org.seepledger.report.page;

import static j2html.TagCreator.article;
import static j2html.TagCreator.dd;
import static j2html.TagCreator.div;
import static j2html.TagCreator.dl;
import static j2html.TagCreator.dt;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.text;

import j2html.tags.DomContent;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.report.Answer;

/** The answer in sentences, for each prism, and for each solute in it. */
final class AnswerSection {

    private AnswerSection() {}

    static DomContent of(Report report) {
        return section(
                        h2("The answer"),
                        p("Rates are means over the whole record, "
                                + report.frame().span(report.record()) + "."),
                        report.results().size() > 1
                                ? TotalsTable.ofRecords(report.frame(), "All prisms", "Prism", report.lines())
                                : text(""),
                        each(report.results(), result -> of(Answer.of(result, report.origins(), report.wording()))))
                .withId("answer");
    }

    /** For solutes. */
    static DomContent of(SoluteReport report) {
        return section(
                        h2("The answer"),
                        p("Rates are means over the whole record, "
                                + report.frame().span(report.record())
                                + ". Where nothing else is said, non-detects count half their limit."),
                        report.results().size() > 1
                                ? TotalsTable.ofRecords(
                                        report.frame(), "All prisms and solutes", "Solute, prism", report.lines())
                                : text(""),
                        each(report.results(), result -> of(Answer.of(result, report.units(), report.wording()))))
                .withId("answer");
    }

    private static DomContent of(Answer answer) {
        List<DomContent> topics = new ArrayList<>();
        for (Answer.Topic topic : Answer.Topic.values()) {
            List<String> sentences = answer.on(topic).toList();
            if (!sentences.isEmpty()) {
                topics.add(div(dt(topic.question()), dd(each(sentences, sentence -> p(sentence)))));
            }
        }
        return article(h3(answer.prism()), dl(topics.toArray(DomContent[]::new)).withClass("answer"));
    }
}
