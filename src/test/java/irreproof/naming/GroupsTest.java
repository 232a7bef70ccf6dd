package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.engine.lie.Series;
import irreproof.notation.GroupName;
import irreproof.notation.GroupName.Factor;
import irreproof.text.Span;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Groups by their complex algebras: isomorphisms and real forms as in any textbook (common practice). */
class GroupsTest {
    /** Columns: the name's parts, the algebra, the group whose naming customs hold, and what messages print. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            nullValues = "-",
            value = {
                "SU   | 3     | - | A2   | SU(3)  | SU(3)",
                "SU   | 2     | - | A1   | SU(2)  | SU(2)",
                "SU   | 2 2   | - | A3   | SU(4)  | SU(2,2)",
                "SU   | 1 1   | - | A1   | SU(2)  | SU(1,1)",
                "SL   | 8     | - | A7   | SU(8)  | SL(8)",
                "SL   | 4     | R | A3   | SU(4)  | SL(4,R)",
                "SL   | 3     | C | A2   | SU(3)  | SL(3,C)",
                "SL   | 2     | H | A3   | SU(4)  | SL(2,H)",
                "SL   | 2     | R | A1   | SU(2)  | SL(2,R)",
                "SO   | 3     | - | A1   | SO(3)  | SO(3)",
                "SO   | 2 1   | - | A1   | SO(3)  | SO(2,1)",
                "SO   | 5     | - | B2   | SO(5)  | SO(5)",
                "SO   | 6     | - | D3   | SO(6)  | SO(6)",
                "SO   | 9 1   | - | D5   | SO(10) | SO(9,1)",
                "Spin | 10    | - | D5   | SO(10) | Spin(10)",
                "Spin | 7     | - | B3   | SO(7)  | Spin(7)",
                "SO   | 32    | - | D16  | SO(32) | SO(32)",
                "USp  | 8     | - | C4   | Sp(8)  | USp(8)",
                "USp  | 2 2   | - | C2   | Sp(4)  | USp(2,2)",
                "Sp   | 4     | - | C2   | Sp(4)  | Sp(4)",
                "Sp   | 4     | R | C2   | Sp(4)  | Sp(4,R)",
                "Sp   | 2     | - | A1   | Sp(2)  | Sp(2)",
                "Sp   | 3     | - | C3   | Sp(6)  | Sp(3)",
                "Sp   | 1     | - | A1   | Sp(2)  | Sp(1)",
                "Sp   | 1 1   | - | C2   | Sp(4)  | Sp(1,1)",
                "E    | 7     | - | E7   | E7     | E7",
                "F    | 4     | - | F4   | F4     | F4",
                "G    | 2     | - | G2   | G2     | G2",
            })
    void resolvesRealFormsAndCovers(
            String family, String arguments, String suffix, String algebra, String customs, String display) {
        Resolution resolution = Groups.resolve(name(factor(family, arguments, suffix, "X", false)));
        LieGroup group = assertInstanceOf(Resolution.Simple.class, resolution).group();
        assertEquals(algebra, group.algebra().toString());
        assertEquals(display, group.display());
        assertEquals(WrittenNames.family(customs), group);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            nullValues = "-",
            value = {
                "SU | -  | - | SU(n)  | SU(n) with a symbol for its size is not judged yet",
                "SL | 2  | C | SL(2,C)| irreps of SL(2,C) are pairs of spins, and those are not judged yet",
                "SO | 4  | - | SO(4)  | SO(4) is not simple, and product groups are not judged yet",
                "SO | 1 3| - | SO(1,3)| SO(1,3) is not simple, and product groups are not judged yet",
                "SO | 2  | - | SO(2)  | SO(2) is abelian, and charges are not judged yet",
                "SU | 1  | - | SU(1)  | SU(1) is not a group known here",
                "U  | 1  | - | U(1)   | U(1) has a U(1) factor, and charges are not judged yet",
                "U  | 3  | - | U(3)   | U(3) has a U(1) factor, and charges are not judged yet",
                "O  | 3  | - | O(3)   | O(3) is not connected, and such groups are not judged yet",
                "O  | -  | h | Oh     | point groups are not judged yet",
                "A  | 4  | - | A4     | A4 is read as a finite or point group, and those are not judged yet",
                "D  | 3  | h | D3h    | D3h is read as a finite or point group, and those are not judged yet",
                "T  | -  | d | Td     | Td is read as a finite or point group, and those are not judged yet",
                "E  | 9  | - | E9     | E9 is not a group known here",
                "USp| 5  | - | USp(5) | USp(5) is not a group known here",
                "SU | 2000000000 2000000000 | - | SU(2000000000,2000000000) | SU(2000000000,2000000000) has a rank above 128, "
                        + "larger than the groups judged here",
                "SU | 130| - | SU(130)| SU(130) has a rank above 128, larger than the groups judged here",
            })
    void saysInPlainWordsWhatIsNotJudged(
            String family, String arguments, String suffix, String display, String reason) {
        Resolution resolution = Groups.resolve(name(factor(family, arguments, suffix, "", false)));
        assertEquals(new Resolution.Unsupported(display, reason), resolution);
    }

    @Test
    void printsProductsWithTheirLabels() {
        GroupName name = name(
                factor("SU", "3", null, "C", false),
                factor("SU", "2", null, "L", true),
                factor("U", "1", null, "Y", false));
        Resolution resolution = Groups.resolve(name);
        assertEquals("SU(3)_C x su(2)_L x U(1)_Y", Groups.display(name));
        assertEquals(
                new Resolution.Unsupported("SU(3)_C x su(2)_L x U(1)_Y", "product groups are not judged yet"),
                resolution);
    }

    @Test
    void groupsWithoutASimpleAlgebraCannotBeBuilt() {
        assertThrows(IllegalArgumentException.class, () -> LieGroup.su(1));
        assertThrows(IllegalArgumentException.class, () -> LieGroup.so(4));
        assertThrows(IllegalArgumentException.class, () -> LieGroup.sp(5));
        assertThrows(IllegalArgumentException.class, () -> LieGroup.exceptional(Series.A, 4));
        assertThrows(IllegalArgumentException.class, () -> LieGroup.exceptional(Series.E, 9));
    }

    private static GroupName name(Factor... factors) {
        return new GroupName(List.of(factors), new Span(0, 0));
    }

    private static Factor factor(String family, String arguments, String suffix, String label, boolean algebra) {
        List<Integer> numbers = arguments == null
                ? List.of()
                : Arrays.stream(arguments.split(" ")).map(Integer::valueOf).toList();
        return new Factor(family, numbers, suffix == null ? "" : suffix, label, algebra);
    }
}
