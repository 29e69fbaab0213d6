package org.kappatrail.review.decision;

import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a past act did.
 *
 * @param date day of the act
 * @param act what was done
 * @param kappaBefore κ of the governing bearing at the last sample before
 * @param kappaAfter κ at the first sample after
 * @param waterBefore water before, mg/kg
 * @param waterAfter water after
 * @param codeBefore cleanliness code before
 * @param codeAfter code after
 * @param worked whether it did what such an act should
 * @param sentence the same in words
 */
public record FollowUp(
    LocalDate date,
    String act,
    OptionalDouble kappaBefore,
    OptionalDouble kappaAfter,
    OptionalDouble waterBefore,
    OptionalDouble waterAfter,
    Optional<String> codeBefore,
    Optional<String> codeAfter,
    Answer worked,
    String sentence) {}
