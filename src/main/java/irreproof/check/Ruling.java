package irreproof.check;

import irreproof.check.judge.Judgement;
import irreproof.check.judge.LieLexicon;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;

/**
 * What was decided of one statement, and in which setting.
 *
 * @param setting the setting it was decided in, or the nearest one; null if none was found
 * @param source where that setting comes from
 * @param judgement in that setting; null if it was not judged in any
 * @param lexicon the names of that setting; null if it was not judged in any
 * @param heldElsewhere the setting, named further away, in which it holds although it fails in the nearest; or null
 * @param dimensions the dimensions of two sides that differ whatever the group is; or null
 */
record Ruling(
        Verdict verdict,
        String reason,
        SettingCandidate setting,
        SettingSource source,
        Judgement<DominantWeight> judgement,
        LieLexicon lexicon,
        SettingCandidate heldElsewhere,
        Dimensions dimensions) {
    /**
     * Two sides whose dimensions differ in every group.
     *
     * @param side the index of the side that does not fit
     * @param against the index of the side it is held against
     */
    record Dimensions(int side, int against, BigInteger found, BigInteger expected) {}

    static Ruling undecided(String reason, SettingCandidate setting, SettingSource source) {
        return new Ruling(Verdict.UNDECIDED, reason, setting, source, null, null, null, null);
    }

    /** The group as printed in reports, or empty. */
    String settingName() {
        if (lexicon != null) {
            return lexicon.group().display();
        }
        return setting == null ? "" : setting.group().display();
    }
}
