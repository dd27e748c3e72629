package org.seepledger.review.mapping;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.seepledger.review.sheet.Amount;
import org.seepledger.review.sheet.UnitWords;

/** Tells from its heading what a column holds. */
final class ColumnWords {

    private static final Map<Pattern, Role> ROLES = roles();
    private static final Pattern SHARE = Pattern.compile("%|per ?cent|share|of total|of throughput");
    private static final Pattern OF_THE_WHOLE = Pattern.compile("closure|error|discrepanc|imbalance|residual");
    private static final Pattern VALUE = Pattern.compile(
            "(net|gross|mean|average|total)? ?(values?|amounts?|rates?|volumes?|flows?|flow rates?|depths?|in|out|net|in-?flows?|out-?flows?|quantity|balance|credit|debit|gains?|losses)( (rates?|volumes?|flows?|values?|depth))?");

    private ColumnWords() {}

    private static Map<Pattern, Role> roles() {
        Map<Pattern, Role> roles = new LinkedHashMap<>();
        roles.put(Pattern.compile("rate[ _]units?"), Role.RATE_UNIT);
        roles.put(Pattern.compile("volume[ _]units?"), Role.VOLUME_UNIT);
        roles.put(Pattern.compile("units?( of measure(ment)?)?|measured in"), Role.UNIT);
        roles.put(Pattern.compile("from|start|begins?|from[ _]date|start( date)?|beginning"), Role.FROM);
        roles.put(Pattern.compile("to|end|ends?|until|to[ _]date|end( date)?"), Role.TO);
        roles.put(
                Pattern.compile(
                        "periods?|months?|(water |calendar |hydrological )?years?|date|time|season|interval|time ?step"),
                Role.PERIOD);
        roles.put(
                Pattern.compile(
                        "(budget |balance |water |flow )?(items?|terms?|components?|categor(y|ies)|elements?|process)|description|parameter|budget"),
                Role.TERM);
        roles.put(Pattern.compile("groups?|types?|kind|class|section"), Role.GROUP);
        roles.put(Pattern.compile("(aquifer )?layers?( no\\.?| number)?"), Role.LAYER);
        roles.put(Pattern.compile("direction|sense|in ?/ ?out|flow direction|sign"), Role.SENSE);
        roles.put(
                Pattern.compile(
                        "(.* )?(prisms?|areas?|zones?|regions?|sub-?areas?|sub-?basins?|basins?|catchments?|domains?|sites?|blocks?|volumes? of ground)"),
                Role.AREA);
        roles.put(
                Pattern.compile(
                        "mean|average|avg\\.?|median|min(imum)?|max(imum)?|remarks?|notes?|comments?|source|references?|methods?|uncertainty|no\\.?|#|id|days|rank|reliability|confidence"),
                Role.IGNORED);
        return roles;
    }

    /** The role that a heading names; empty if it names none. */
    static Optional<Role> role(String heading) {
        String words = TermWords.plain(heading);
        if (SHARE.matcher(heading.toLowerCase(java.util.Locale.ROOT)).find()
                && !OF_THE_WHOLE.matcher(words).find()) {
            return Optional.of(Role.IGNORED);
        }
        for (Map.Entry<Pattern, Role> known : ROLES.entrySet()) {
            if (known.getKey().matcher(words).matches()) {
                return Optional.of(known.getValue());
            }
        }
        return VALUE.matcher(words).matches() ? Optional.of(Role.VALUE) : Optional.empty();
    }

    /** Which way a heading of figures says that they count. */
    static Optional<Sense> sense(String heading) {
        String words = TermWords.plain(heading)
                .replaceAll("\\b(rates?|volumes?|flow|mean|total)\\b", "")
                .strip();
        if (words.matches("net|balance")) {
            return Optional.of(Sense.NET);
        }
        if (words.matches("gross")) {
            return Optional.empty();
        }
        return Optional.ofNullable(TermWords.direction(words, false));
    }

    /** Whether a heading says rates or volumes, in words or by its unit. */
    static Optional<Amount> amount(String heading) {
        Optional<Amount> byUnit = UnitWords.in(heading)
                .flatMap(UnitWords::of)
                .map(unit -> unit.perPeriod() ? Amount.VOLUME : unit.amount());
        String words = TermWords.plain(heading);
        Optional<Amount> byWord = words.contains("volume")
                ? Optional.of(Amount.VOLUME)
                : words.matches(".*\\brates?\\b.*") ? Optional.of(Amount.RATE) : Optional.empty();
        return byUnit.or(() -> byWord);
    }
}
