package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Published;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class DynkinNumberingTest {
    /** Both columns of labels.tsv, each row with its source. */
    @Test
    void readsThePublishedLabelsInEitherOrder() {
        for (Map<String, String> row : Published.rows("labels.tsv")) {
            LieGroup group = WrittenNames.group(row.get("group")).orElseThrow();
            DominantWeight irrep = Published.weight(group.algebra(), row.get("dynkin_bourbaki"));
            DominantWeight asSlansky = Published.weight(group.algebra(), row.get("dynkin_physics"));
            List<Candidate> candidates = DynkinNumbering.candidates(group, irrep.labels());
            assertEquals(new Candidate(irrep, Custom.TABLES), candidates.get(0));
            List<Candidate> slansky = DynkinNumbering.candidates(group, asSlansky.labels());
            Custom custom = asSlansky.equals(irrep) ? Custom.TABLES : Custom.MIRRORED;
            assertTrue(slansky.contains(new Candidate(irrep, custom)), row::toString);
        }
    }

    @Test
    void refusesOtherNumbersOfLabels() {
        assertEquals(List.of(), DynkinNumbering.candidates(LieGroup.su(3), 1));
        assertEquals(List.of(), DynkinNumbering.candidates(LieGroup.su(3), 1, -1));
    }
}
