package org.seepledger.report.page;

import j2html.tags.ContainerTag;
import java.util.Optional;

/**
 * What a table or section is about.
 *
 * @param prism the prism
 * @param solute the solute, where the budget is of one
 * @param id what its section is called within the page
 */
record About(String prism, Optional<String> solute, String id) {

    String name() {
        return solute.map(of -> of + " in " + prism).orElse(prism);
    }

    /** Says in data attributes what a table or row is about. */
    <T extends ContainerTag<T>> T mark(T tag) {
        tag.withData("prism", prism);
        solute.ifPresent(of -> tag.withData("solute", of));
        return tag;
    }
}
