package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ParagraphTest {

    @Test
    void wordsAreKeptInOrderAndLinesFit() {
        String words = "Gains 1 337 = losses 1 355 + change in storage −17.89 + residual 0, in m³/d.";
        Paragraph paragraph = new Paragraph(words, 12, 150);
        assertThat(paragraph.lines()).hasSizeGreaterThan(2).allMatch(line -> Lettering.width(line, 12) <= 150);
        assertThat(String.join(" ", paragraph.lines())).isEqualTo(words);
        assertThat(paragraph.marks(0, 0, Ink.Token.TEXT)).hasSameSizeAs(paragraph.lines());
    }

    @Test
    void aWordThatIsTooLongIsCut() {
        assertThat(new Paragraph("unquestionablyoverlongname", 12, 80).lines())
                .singleElement()
                .satisfies(line -> assertThat(line).endsWith("…"));
    }
}
