package irreproof.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.latex.PlainText;
import irreproof.latex.Reader;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GroupReaderTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            the $SU(3)$ group | SU[3]
            $\\mathrm{SU}(3)_C\\times\\mathrm{SU}(2)_L\\times U(1)_Y$ | SU[3]_C*SU[2]_L*U[1]_Y
            SU(5)$\\to$SU(3)$\\times$SU(2) | SU[5] SU[3]*SU[2]
            SU(3)\\textsubscript{C} x SU(2) | SU[3]_C*SU[2]
            SU(3)xSU(2)xU(1) | SU[3]*SU[2]*U[1]
            $SU(3)\\otimes SU(2)$ | SU[3]*SU[2]
            \\SU(3), $\\mathfrak{su}(3)$ and $\\mathfrak{su}_3$ | SU[3] su[3] su[3]
            $SO(10)\\supset SU(5)\\times U(1)_\\chi$ | SO[10] SU[5]*U[1]_χ
            $\\mathfrak{so}(1,9)$ or $\\mathrm{Spin}(10)$ | so[1, 9] Spin[10]
            $E_6$, E8, ${\\rm E}_{7(7)}$, $F_4$ and $G_2$ | E[6] E[8] E[7] F[4] G[2]
            $\\mathrm{SL}(2,\\mathbb{C})$ and $Sp(4,\\mathbb{R})$ | SL[2]C Sp[4]R
            $\\mathrm{USp}(8)$, $USP(4)$, $Sp(4)$ | USp[8] USp[4] Sp[4]
            $SU(N)$ and $SU(N_c)$ with $SO(2n+1)$ | SU[] SU[] SO[]
            $SU(N=3)$ | SU[3]
            $SU(3)^3$ and $[SU(2)]^2$ | SU[3]*SU[3]*SU[3] SU[2]*SU[2]
            $\\mathfrak{su}(2)\\oplus\\mathfrak{su}(2)\\oplus\\mathfrak{u}(1)$ | su[2]*su[2]*u[1]
            the algebra $\\mathfrak{g}_2$ and the $\\mathfrak{e}_6$ subalgebra | g[2] e[6]
            $D_{3h}$, $\\mathcal{C}_{\\rm 3v}$ and $O_h$ | D[3]h C[3]v O[]h
            an $A_4$ flavour symmetry and the group $S_4$ | A[4] S[4]
            the point group $T_d$ | T[]d
            the groups $A_4$, $S_4$ and $A_5$ | A[4] S[4] A[5]
            $E_8\\times E_8$ or $SO(32)$ strings | E[8]*E[8] SO[32]
            ${\\rm SU}(2)_{\\rm L}$ $\\times$ ${\\rm SU}(2)_{\\rm R}$ | SU[2]_L*SU[2]_R
            SU(5)-breaking and the SU(5)s | SU[5] SU[5]_s
            $SU^*(4)$ and $SO^*(8)$ | SU[4] SO[8]
            an $O(3)$ vector of $O(N)$ models | O[3] O[]
            """)
    void findsGroups(String latex, String expected) {
        assertEquals(expected, names(GroupReader.find(Reader.flatten(latex))));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            $G_2(x)$ and $F_4(\\phi)$
            $g_2$ and $e_6$ are couplings
            $A_4$, $S_3$ and $T_1\\oplus T_2$
            $U(x)$, $U(t)$, $u(1)$ and $O(\\alpha_s)$, $O(1)$
            $PSU(2,2|4)$ and $SU(2,2|4)$
            SO$_2$ and PSU(3)
            the E6SSM
            ISO(3) and cosu(3)
            $T_d$ is the temperature at decoupling
            the $C_2$ of a representation and $T_2$ in the group
            $C_v$, $C_{10}$ and $B_1$
            """)
    void keepsSilentOnLookAlikes(String latex) {
        assertEquals("", names(GroupReader.find(Reader.flatten(latex))));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            SU(5) | SU[5]
            ' su(3) ' | su[3]
            $\\mathrm{SO}(10)$ | SO[10]
            SU(3) x SU(2) x U(1) | SU[3]*SU[2]*U[1]
            E_6 | E[6]
            G2 | G[2]
            A_4 | A[4]
            g_2 | g[2]
            SU(3) or so |
            the SU(3) |
            '' |
            """)
    void readsOneGroup(String latex, String expected) {
        PlainText text = Reader.flatten(latex);
        String read = GroupReader.read(text).map(name -> names(List.of(name))).orElse(null);
        assertEquals(expected, read);
    }

    @Test
    void aNameStandsWhereTheAuthorWroteIt() {
        String latex = "of $\\mathrm{SU}(3)_C\\times U(1)$ there";
        GroupName name = GroupReader.find(Reader.flatten(latex)).get(0);
        assertEquals("SU}(3)_C\\times U(1)", name.span().of(latex));
    }

    private static String names(List<GroupName> names) {
        return names.stream()
                .map(name -> name.factors().stream()
                        .map(factor -> (factor.algebra() ? factor.family().toLowerCase() : factor.family())
                                + factor.arguments()
                                + factor.suffix()
                                + (factor.label().isEmpty() ? "" : "_" + factor.label()))
                        .collect(Collectors.joining("*")))
                .collect(Collectors.joining(" "));
    }
}
