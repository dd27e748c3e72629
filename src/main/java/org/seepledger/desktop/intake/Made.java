package org.seepledger.desktop.intake;

import org.seepledger.intake.Composition;
import org.seepledger.intake.Plan;

/**
 * What a plan makes.
 *
 * @param plan the plan
 * @param copied the folder, with its files copied
 * @param placed the folder, with its files where they lie
 */
record Made(Plan plan, Composition copied, Composition placed) {

    static Made of(Plan plan) {
        return new Made(plan, Composition.of(plan, false), Composition.of(plan, true));
    }
}
