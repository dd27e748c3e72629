package org.seepledger.job;

import java.util.function.Function;
import org.seepledger.picture.Picture;
import org.seepledger.progress.Progress;

/**
 * A picture as a view shows it, drawn when it is wanted.
 *
 * @param name what its files are called, without their ending
 * @param draws draws it, beside the window; told how far it is
 */
public record ShownPicture(String name, Function<Progress, Picture> draws) {}
