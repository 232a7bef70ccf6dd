package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.lie.Published;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Products and branchings that any textbook has (common practice), in several notations. */
class DerivationTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) | \\mathbf{3}\\otimes\\mathbf{3} | \\mathbf{6}\\oplus\\bar{\\mathbf{3}}",
                "SU(3) | \\Lambda^2\\mathbf{3} | \\bar{\\mathbf{3}}",
                "SU(3) | \\mathrm{Sym}^2(\\mathbf{3}\\oplus\\mathbf{1})"
                        + " | \\mathbf{6}\\oplus\\mathbf{3}\\oplus\\mathbf{1}",
                "SO(5) | \\mathbf{4}\\otimes\\mathbf{4} | \\mathbf{10}\\oplus\\mathbf{5}\\oplus\\mathbf{1}",
                "O(3) | \\mathbf{3}\\otimes\\mathbf{3} | \\mathbf{5}\\oplus\\mathbf{3}\\oplus\\mathbf{1}",
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2})_{1/6}\\otimes(\\bar{\\mathbf 3},\\mathbf 1)_{1/3}"
                        + " | (\\mathbf{8},\\mathbf{2})_{1/2}\\oplus(\\mathbf{1},\\mathbf{2})_{1/2}",
                "SU(3)_C x SU(2)_L x U(1)_Y | (3,2,\\frac16)\\otimes(\\bar 3,1,-\\frac23) | (8,2,-\\frac{1}{2})\\oplus(1,2,-\\frac{1}{2})",
                "SU(5) x U(1) | \\mathbf{5}_{1}\\otimes\\bar{\\mathbf{5}}_{-1} | \\mathbf{24}_{0}\\oplus\\mathbf{1}_{0}",
                "U(2) | \\mathbf{2}_{1}\\otimes\\mathbf{2}_{1} | \\mathbf{3}_{2}\\oplus\\mathbf{1}_{2}",
                "SU(2) x SU(2) | \\Lambda^2(\\mathbf{2},\\mathbf{2}) | (\\mathbf{3},\\mathbf{1})\\oplus(\\mathbf{1},\\mathbf{3})",
                "SU(2) x SU(2) x U(1) | (2,2)_{+1}\\otimes(2,1)_{-1/2}" + " | (3,2)_{+1/2}\\oplus(1,2)_{+1/2}",
                "SO(4) | (\\mathbf{2},\\mathbf{2})^{\\otimes 2} | (\\mathbf{3},\\mathbf{3})\\oplus(\\mathbf{3},\\mathbf{1})"
                        + "\\oplus(\\mathbf{1},\\mathbf{3})\\oplus(\\mathbf{1},\\mathbf{1})",
                "SO(4) | (2,2)\\otimes(2,1) | (3,2)\\oplus(1,2)",
                "SL(2,C) | (1/2,0)\\otimes(1/2,0) | (1,0)\\oplus(0,0)",
                "SO(1,3) | (\\tfrac12,\\tfrac12)\\otimes(\\tfrac12,\\tfrac12) | (1,1)\\oplus(1,0)\\oplus(0,1)\\oplus(0,0)",
                "Sp(2) x Sp(1) | (\\mathbf{4},\\mathbf{2})\\otimes(\\mathbf{1},\\mathbf{2})"
                        + " | (\\mathbf{4},\\mathbf{3})\\oplus(\\mathbf{4},\\mathbf{1})",
            })
    void completesInTheAuthorsNotation(String group, String latex, String right) {
        assertEquals(latex + " = " + right, derived(latex, group, DerivedNotation.AUTHOR));
    }

    /** The rows of products.tsv about the Lorentz group, each with its source there. */
    @Test
    void multipliesPairsOfSpinsAsPublished() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("products.tsv")) {
            if (row.get("kind").equals("lorentz")) {
                String latex = row.get("factors").replace(" x ", "\\otimes");
                String result = derived(latex, "SL(2,C)", DerivedNotation.AUTHOR);
                String right = result.substring(result.indexOf(" = ") + 3);
                assertEquals(terms(row.get("decomposition"), " \\+ ", "*"), terms(right, "\\\\oplus", "\\,"), latex);
                checked++;
            }
        }
        assertEquals(11, checked);
    }

    private static List<String> terms(String sum, String sign, String counting) {
        List<String> terms = new ArrayList<>();
        for (String term : sum.split(sign)) {
            int at = term.indexOf(counting);
            int count = at < 0 ? 1 : Integer.parseInt(term.substring(0, at));
            String name = at < 0 ? term : term.substring(at + counting.length());
            terms.addAll(Collections.nCopies(count, name));
        }
        terms.sort(null);
        return terms;
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) | DYNKIN | \\mathbf{3}\\otimes\\bar{\\mathbf{3}} | (1,1)\\oplus(0,0)",
                "SU(3) | YOUNG | \\mathbf{3}\\otimes\\mathbf{3} | \\yng(2)\\oplus\\yng(1,1)",
                "SU(3) | DIMENSION | (1,0)\\otimes(1,0) | \\mathbf{6}\\oplus\\bar{\\mathbf{3}}",
                "SU(3) | DIMENSION | (3,0) | \\mathbf{10}",
                "SO(10) | DYNKIN | \\mathbf{16} | (0,0,0,0,1)",
                "SU(3) x SU(2) x U(1) | DYNKIN | (\\mathbf{3},\\mathbf{2})_{1/6}\\otimes(\\mathbf{1},\\mathbf{2})_{1/2}"
                        + " | ((1,0),(2))_{2/3}\\oplus((1,0),(0))_{2/3}",
            })
    void namesIrrepsAsAsked(String group, DerivedNotation notation, String latex, String right) {
        assertEquals(latex + " = " + right, derived(latex, group, notation));
    }

    /** Slansky 1981 (from memory) but for signs of charges. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "E6 -> F4 | \\mathbf{27} | \\mathbf{26}\\oplus\\mathbf{1}",
                "SU(6) > SU(3) x SU(2) | 6 | (3,2)",
                "SO(10) -> SU(2) x SU(2) x SU(4) | \\mathbf{10}"
                        + " | (\\mathbf{1},\\mathbf{1},\\mathbf{6})\\oplus(\\mathbf{2},\\mathbf{2},\\mathbf{1})",
                "SO(10) -> SO(9) -> SO(8) | \\mathbf{16} | \\mathbf{8}_c\\oplus\\mathbf{8}_s",
            })
    void branches(String groups, String latex, String right) {
        assertEquals(latex + " \\to " + right, derived(latex, groups, DerivedNotation.AUTHOR));
    }

    @Test
    void saysHowChargesAreNormalised() {
        assertEquals(
                "\\mathbf{27} \\to \\mathbf{16}_{1}\\oplus\\mathbf{10}_{-2}\\oplus\\mathbf{1}_{4}"
                        + " % charges are coprime whole numbers, their signs a choice",
                derived("\\mathbf{27}", "E6 -> SO(10) x U(1)", DerivedNotation.AUTHOR));
        assertEquals(
                "\\mathbf{5} \\to (\\mathbf{3},\\mathbf{1})_{-2}\\oplus(\\mathbf{1},\\mathbf{2})_{3}"
                        + " % charges are coprime whole numbers, their signs a choice",
                derived("\\mathbf{5}", "SU(5) -> SU(3) x SU(2) x U(1)", DerivedNotation.AUTHOR));
    }

    @Test
    void givesALineForEachEmbeddingThatTheIrrepsTellApart() {
        assertEquals(
                "\\mathbf{8} \\to \\mathbf{5}\\oplus\\mathbf{3} % SO(n) in SU(n), by \\mathbf{3}\n"
                        + "\\mathbf{8} \\to \\mathbf{3}\\oplus\\mathbf{2}\\oplus\\mathbf{2}\\oplus\\mathbf{1}"
                        + " % Levi, node 1 deleted, by \\mathbf{2}\\oplus\\mathbf{1}",
                derived("\\mathbf{8}", "SU(3) -> SO(3)", DerivedNotation.AUTHOR));
        assertEquals(
                "\\mathbf{8}_v \\to \\mathbf{7}\\oplus\\mathbf{1} % SO(n) x SO(m) in SO(n+m), by"
                        + " \\mathbf{7}\\oplus\\mathbf{1}\n"
                        + "\\mathbf{8}_v \\to \\mathbf{8} % SO(n) x SO(m) in SO(n+m), by \\mathbf{8}",
                derived("\\mathbf{8}_v", "SO(8) -> SO(7)", DerivedNotation.AUTHOR));
        assertEquals("\\mathbf{6} \\to \\mathbf{6}", derived("\\mathbf{6}", "SU(6) -> Sp(6)", DerivedNotation.AUTHOR));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) | \\mathbf{8} | one irrep of SU(3) needs no completion; for a branching name two groups, as in"
                        + " --group 'SU(3) -> SU(2) x U(1)'",
                "SU(3) | \\mathbf{5}\\otimes\\mathbf{3} | SU(3) has no irrep \\mathbf{5}",
                "SU(3) x SU(2) | (\\mathbf{5},\\mathbf{2})\\otimes(\\mathbf{3},\\mathbf{2}) | SU(3) x SU(2) has no irrep"
                        + " (\\mathbf{5},\\mathbf{2})",
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2})\\otimes(\\mathbf{3},\\mathbf{2}) | irreps of SU(3) x SU(2)"
                        + " x U(1) are written as a bracket of 2 names, one for each factor, with a charge, as in"
                        + " (\\ldots)_{1/6}",
                "SU(3) x A_4 | 3\\otimes 3 | SU(3) x A4: A4 is read as a finite or point group, and those are not judged"
                        + " yet",
                "SU(3) -> E6 | \\mathbf{8} | no embedding of E6 in SU(3) is known here",
                "SU(3) -> nothing | \\mathbf{8} | \"nothing\" is not a group such as SU(5)",
                "nothing | 3\\otimes 3 | \"nothing\" is not a group such as SU(5)",
            })
    void saysInPlainWordsWhatCannotBeCompleted(String group, String latex, String reason) {
        Derivation.Result result = Derivation.derive(latex, group, DerivedNotation.AUTHOR, Budget.of(100_000_000));
        assertEquals(reason, result.text());
        assertFalse(result.ok());
    }

    private static String derived(String latex, String group, DerivedNotation notation) {
        Derivation.Result result = Derivation.derive(latex, group, notation, Budget.of(1_000_000_000));
        assertTrue(result.ok(), result.text());
        return result.text();
    }
}
