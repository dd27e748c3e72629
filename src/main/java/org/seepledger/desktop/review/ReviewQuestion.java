package org.seepledger.desktop.review;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.job.ReviewAsked;
import org.seepledger.job.ReviewDesk;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/**
 * A review that is wanted.
 *
 * @param set the open set; empty for none
 * @param prisms the prisms drawn on it; none to look at the table by itself
 * @param asked what is to be reviewed, and how
 * @param reading grows each time that the file is to be read anew
 */
record ReviewQuestion(Optional<OpenSet> set, List<Prism> prisms, ReviewAsked asked, int reading) {

    ReviewQuestion {
        prisms = List.copyOf(prisms);
    }

    ReviewAnswer answer(Progress progress) {
        return set.filter(open -> !prisms.isEmpty())
                .map(open -> open.workbench().reviews().against(asked, prisms, progress))
                .orElseGet(() -> ReviewDesk.alone(asked));
    }
}
