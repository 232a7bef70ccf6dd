package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Common practice; values as in any textbook on SU(n). */
class YoungDiagramsTest {
    @Test
    void rowsAndColumnsLeadBackToTheIrrep() {
        for (int degree = 2; degree <= 6; degree++) {
            LieGroup group = LieGroup.su(degree);
            List<DominantWeight> irreps =
                    IrrepSearch.upToDimension(group.algebra(), BigInteger.valueOf(500), Budget.unlimited());
            for (DominantWeight irrep : irreps) {
                List<Integer> rows = YoungDiagrams.rows(irrep);
                assertEquals(Optional.of(irrep), YoungDiagrams.irrep(group, rows));
                assertEquals(Optional.of(irrep), YoungDiagrams.irrepOfColumns(group, columns(rows)));
                // columns of length n may be added
                List<Integer> longer = new ArrayList<>();
                for (int row = 0; row < degree; row++) {
                    longer.add((row < rows.size() ? rows.get(row) : 0) + 3);
                }
                assertEquals(Optional.of(irrep), YoungDiagrams.irrep(group, longer));
            }
        }
    }

    private static List<Integer> columns(List<Integer> rows) {
        List<Integer> columns = new ArrayList<>();
        for (int column = 0; !rows.isEmpty() && column < rows.get(0); column++) {
            int place = column;
            columns.add((int) rows.stream().filter(length -> length > place).count());
        }
        return columns;
    }

    @Test
    void readsDiagramsOfSu3() {
        LieGroup su3 = LieGroup.su(3);
        assertEquals(Optional.of(DominantWeight.of(1, 1)), YoungDiagrams.irrep(su3, List.of(2, 1)));
        assertEquals(Optional.of(DominantWeight.of(0, 0)), YoungDiagrams.irrep(su3, List.of()));
        assertEquals(Optional.of(DominantWeight.of(0, 0)), YoungDiagrams.irrep(su3, List.of(1, 1, 1)));
        assertEquals(Optional.of(DominantWeight.of(2, 0)), YoungDiagrams.irrep(su3, List.of(2, 0, 0, 0)));
        assertEquals(Optional.of(DominantWeight.of(1, 1)), YoungDiagrams.irrepOfColumns(su3, List.of(2, 1)));
    }

    @Test
    void refusesWhatIsNoDiagramOfTheGroup() {
        LieGroup su3 = LieGroup.su(3);
        assertEquals(Optional.empty(), YoungDiagrams.irrep(su3, List.of(1, 2)));
        assertEquals(Optional.empty(), YoungDiagrams.irrep(su3, List.of(1, -1)));
        assertEquals(Optional.empty(), YoungDiagrams.irrep(su3, List.of(1, 1, 1, 1)));
        assertEquals(Optional.empty(), YoungDiagrams.irrepOfColumns(su3, List.of(4)));
        assertEquals(Optional.empty(), YoungDiagrams.irrep(LieGroup.so(7), List.of(1)));
    }

    @Test
    void printsDiagrams() {
        assertEquals("\u25a1\u25a1\n\u25a1", YoungDiagrams.drawing(List.of(2, 1)));
        assertEquals("\u2022", YoungDiagrams.drawing(List.of()));
        assertEquals("(2,1^48)", YoungDiagrams.partition(YoungDiagrams.rows(adjoint(50))));
        assertEquals("(3,2)", YoungDiagrams.partition(List.of(3, 2)));
    }

    private static DominantWeight adjoint(int degree) {
        int[] labels = new int[degree - 1];
        labels[0]++;
        labels[degree - 2]++;
        return DominantWeight.of(labels);
    }
}
