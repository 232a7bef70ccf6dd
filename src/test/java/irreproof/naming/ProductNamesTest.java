package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.latex.Reader;
import irreproof.naming.ProductGroup.Entries;
import irreproof.notation.Expression.Name;
import irreproof.notation.StatementFinder;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Tuples and charges in the forms that authors use (common practice). */
class ProductNamesTest {
    private final Budget budget = Budget.of(100_000_000);

    /** Columns: the group, what is written, and the usual irreps of that name as the tables name them. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2})_{1/6}           | (3,2)_1/6",
                "SU(3) x SU(2) x U(1) | (\\bar{\\mathbf{3}},\\mathbf{1})_{-2/3}   | (~3,1)_-2/3",
                "SU(3) x SU(2) x U(1) | \\mathbf{(\\bar 3,1)_{1/3}}               | (~3,1)_1/3",
                "SU(3) x SU(2) x U(1) | \\left(8,2,\\frac{1}{2}\\right)           | (8,2)_1/2",
                "SU(3) x SU(2) x U(1) | (3,2,+\\frac16)                           | (3,2)_1/6",
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2})_{\\pm 6}        | (3,2)_-6 + (3,2)_6",
                "SU(3) x SU(2) x U(1) | ((1,1),(1))_{1/2}                         | (8,2)_1/2",
                "SU(3) x SU(2) x U(1) | (\\yng(2),\\yng(1))_{1}                   | (6,2)_1",
                "SO(10) x U(1)        | \\mathbf{16}_{1}                          | 16_1",
                "SO(10) x U(1)        | \\overline{\\mathbf{16}}_{-1}             | ~16_-1",
                "SO(10) x U(1)        | 16(1)                                     | 16_1",
                "SO(10) x U(1)        | (0,0,0,0,1)_{1}                           | 16_1",
                "U(1) x SU(2) x SU(3) | (2,3)_{1}                                 | (2,3)_1",
                "U(1) x SU(2) x SU(3) | (1/2,2,3)                                 | (2,3)_1/2",
                "U(1) x SU(2) x SU(3) | (2,3,1/2)                                 | (2,3)_1/2",
                "E6 x U(1) x U(1)     | \\mathbf{27}_{1,-2}                       | 27_1,-2",
                "U(1)                 | \\mathbf{1}_{2}                           | ()_2",
            })
    void readsTuples(String group, String written, String expected) {
        ProductNames names = names(group);
        WrittenTuple tuple = tuple(written, names.group()).orElseThrow();
        ProductCandidate usual =
                names.candidates(tuple, Entries.DIMENSIONS, budget).get(0);
        assertEquals(0, usual.unusual());
        String found = usual.value().multiplicities().keySet().stream()
                .map(irrep -> names.labelOf(irrep, budget).toString())
                .collect(Collectors.joining(" + "));
        assertEquals(expected, found);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2})",
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2},\\mathbf{1})_{1}",
                "SU(3) x SU(2)        | (\\mathbf{3},\\mathbf{2})_{1}",
                "SU(3) x SU(2)        | \\mathbf{6}",
                "SU(3) x SU(2) x U(1) | (\\mathbf{3},\\mathbf{2},\\mathbf{1})",
            })
    void whatHasAnotherFormIsNoNameOfTheGroup(String group, String written) {
        assertTrue(tuple(written, names(group).group()).isEmpty());
    }

    @Test
    void numbersCanBeSpins() {
        ProductNames lorentz = names("SL(2,C)");
        WrittenTuple tuple = tuple("(1/2,0)", lorentz.group()).orElseThrow();
        assertTrue(tuple.hasSpin());
        ReductiveIrrep weyl = lorentz.candidates(tuple, Entries.SPINS, budget)
                .get(0)
                .value()
                .multiplicities()
                .firstKey();
        assertEquals("(2,1)", lorentz.labelOf(weyl, budget).toString());
        assertEquals(List.of(), lorentz.candidates(tuple, Entries.DIMENSIONS, budget));
    }

    /** SU(3) has two irreps of dimension 15 and their conjugates. */
    @Test
    void listsWhatSomeAuthorsMeanBehindTheUsual() {
        ProductNames names = names("SU(3) x SU(2)");
        WrittenTuple tuple = tuple("(\\mathbf{15},\\mathbf{2})", names.group()).orElseThrow();
        List<String> meanings = names.candidates(tuple, Entries.DIMENSIONS, budget).stream()
                .map(found -> names.labelOf(found.value().multiplicities().firstKey(), budget)
                        .toString())
                .toList();
        assertEquals(List.of("(15,2)", "(~15,2)", "(15',2)", "(~15',2)"), meanings);
    }

    private static ProductNames names(String group) {
        return new ProductNames(assertInstanceOf(Resolution.Product.class, ProductGroupsTest.resolve(group))
                .group());
    }

    private Optional<WrittenTuple> tuple(String written, ProductGroup group) {
        Name name = (Name) Reader.passage(written)
                .flatMap(passage -> StatementFinder.side(written, passage, budget))
                .orElseThrow()
                .sides()
                .get(0);
        return WrittenTuple.of(name, group);
    }
}
