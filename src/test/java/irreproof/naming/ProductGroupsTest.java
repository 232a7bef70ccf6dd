package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import irreproof.latex.Reader;
import irreproof.naming.ProductGroup.Entries;
import irreproof.notation.GroupName;
import irreproof.notation.GroupReader;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Products and low rank coincidences by their complex algebras (common practice). */
class ProductGroupsTest {
    /** Columns: as written, the algebra in the order of the factors, and what messages print. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3)_C x SU(2)_L x U(1)_Y     | A2+A1+u1    | SU(3)_C x SU(2)_L x U(1)_Y",
                "SU(5) x U(1)_X                 | A4+u1       | SU(5) x U(1)_X",
                "SU(2) x SU(2) x SU(4)          | A1+A1+A3    | SU(2) x SU(2) x SU(4)",
                "SU(3) x SU(3) x SU(3)          | A2+A2+A2    | SU(3) x SU(3) x SU(3)",
                "U(3)                           | A2+u1       | U(3)",
                "U(2,1)                         | A2+u1       | U(2,1)",
                "GL(5,C)                        | A4+u1       | GL(5,C)",
                "U(1)                           | u1          | U(1)",
                "SO(2)                          | u1          | SO(2)",
                "SO(4)                          | A1+A1       | SO(4)",
                "Spin(4)                        | A1+A1       | Spin(4)",
                "SO(4) x SO(6)                  | A1+A1+D3    | SO(4) x SO(6)",
                "E_6 x U(1)_a x U(1)_b          | E6+u1+u1    | E6 x U(1)_a x U(1)_b",
                "U(1) x SO(10)                  | D5+u1       | U(1) x SO(10)",
                "Sp(4) x U(1)                   | C2+u1       | Sp(4) x U(1)",
                "Sp(2) x Sp(1)                  | C2+A1       | Sp(2) x Sp(1)",
                "USp(4) x Sp(1)                 | C2+A1       | USp(4) x Sp(1)",
                "G_2 x SU(2)                    | G2+A1       | G2 x SU(2)",
                "O(4)                           | A1+A1       | O(4), read as SO(4)",
                "O(10) x U(1)                   | D5+u1       | O(10), read as SO(10) x U(1)",
            })
    void resolvesProducts(String written, String algebra, String display) {
        ProductGroup group =
                assertInstanceOf(Resolution.Product.class, resolve(written)).group();
        assertEquals(algebra, group.algebra().toString());
        assertEquals(display, group.display());
        assertEquals(Entries.DIMENSIONS, group.entries());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"SL(2,C)", "SO(1,3)", "SO(3,1)"})
    void readsTheLorentzGroupAsTwoSpins(String written) {
        ProductGroup group =
                assertInstanceOf(Resolution.Product.class, resolve(written)).group();
        assertEquals("A1+A1", group.algebra().toString());
        assertEquals(Entries.SPINS, group.entries());
        assertEquals(written, group.display());
    }

    /** What is simple stays as {@link Groups#resolve} has it. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"SU(3)", "SO(3)", "SO(5)", "SO(6)", "Sp(2)", "SL(4,R)", "E_7", "SO(32)"})
    void simpleGroupsAreAsBefore(String written) {
        assertEquals(Groups.resolve(name(written)), resolve(written));
        assertEquals(Groups.resolve(name(written)).display(), resolve(written).display());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "O(3)  | A1 | O(3), read as SO(3)",
                "O(10) | D5 | O(10), read as SO(10)",
            })
    void saysThatTheFullOrthogonalGroupIsReadAsTheConnectedOne(String written, String algebra, String display) {
        Resolution.Simple simple = assertInstanceOf(Resolution.Simple.class, resolve(written));
        assertEquals(algebra, simple.group().algebra().toString());
        assertEquals(display, simple.display());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) x SU(N)     | SU(n) with a symbol for its size is not judged yet",
                "O(2)              | O(2) is not connected, and such groups are not judged yet",
                "SU(3) x A_4       | A4 is read as a finite or point group, and those are not judged yet",
                "SU(3) x SU(1)     | SU(1) is not a group known here",
                "SU(300) x U(1)    | SU(300) has a rank above 128, larger than the groups judged here",
                "USp(5) x U(1)     | USp(5) is not a group known here",
            })
    void saysWhyAProductIsNotJudged(String written, String reason) {
        Resolution.Unsupported unsupported = assertInstanceOf(Resolution.Unsupported.class, resolve(written));
        assertEquals(reason, unsupported.reason());
    }

    /** Sp(4) is of rank 2 with most physicists, of rank 4 with an author who also writes Sp(1) or Sp(3). */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Sp(4)  | SU(2), USp(8)    | C2",
                "Sp(4)  | Sp(6), Sp(8)     | C2",
                "Sp(4)  | Sp(1) x SU(2)    | C4",
                "Sp(4)  | SU(2), Sp(3)     | C4",
                "Sp(4)  | Sp(1,1)          | C4",
                "Sp(2)  | Sp(2), Sp(6)     | A1",
                "Sp(2)  | Sp(1)            | C2",
                "USp(4) | Sp(1)            | C2",
            })
    void learnsWhatTheNumberOfSpCounts(String written, String mentions, String algebra) {
        SymplecticUsage usage = SymplecticUsage.of(GroupReader.find(Reader.flatten(mentions)));
        Resolution resolution = Groups.resolveFully(name(written), usage);
        assertEquals(
                algebra,
                assertInstanceOf(Resolution.Simple.class, resolution)
                        .group()
                        .algebra()
                        .toString());
    }

    @Test
    void theOrderOfTheFactorsIsTheAuthors() {
        ProductGroup group = ((Resolution.Product) resolve("U(1) x SU(2) x SU(3)")).group();
        assertEquals(List.of(LieGroup.su(2), LieGroup.su(3)), group.factors());
        assertEquals(new ProductGroup.Charge(), group.parts().get(0));
        assertEquals(1, group.charges());
    }

    static Resolution resolve(String written) {
        return Groups.resolveFully(name(written), SymplecticUsage.SIZE);
    }

    private static GroupName name(String written) {
        return GroupReader.read(Reader.flatten(written)).orElseThrow(() -> new AssertionError(written));
    }
}
