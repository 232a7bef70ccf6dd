package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** How manuscripts are flattened. */
final class ProseTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Under $\\mathrm{SU}(3)$: | Under SU(3):",
                "$\\mathfrak{su}(3)$ | su(3)",
                "$\\specialUnitary(3)$ | SU(3)",
                "$E_6$ and $E_{6}$ and $E_{7(7)}$ | E_6 and E_6 and E_{7(7)}",
                "$SU(3)_{\\rm C}$ | SU(3)_C",
                "$SU(5) \\to SU(3)\\times SU(2)$ | SU(5)→SU(3)×SU(2)",
                "the~group $\\text{SU}\\,(3)$ | the group SU (3)",
                "\\textbf{SU(3)}\\label{x} is~a % hidden | SU(3) is a",
                "\\newcommand{\\SU}[1]{\\ensuremath{\\mathrm{SU}( #1 )}}the \\SU{3} group | the SU(3) group",
                "\\def\\SU{\\mathrm{SU}}the $\\SU(3)$ group | the SU(3) group",
                "$\\mathcal{N}=8$ | N=8",
                "$SU(3)_\\mathrm{fl}$ | SU(3)_{fl}",
                "$SO(10)\\xrightarrow{M_X}SU(5)\\overset{a}{\\to}SL(2,\\C)$ | SO(10)→SU(5)→SL(2,C)",
                "a\\\\ [SU(3)]\\\\[2pt] b \\linebreak[3] c | a [SU(3)] b c",
                "\\item[SU(3)] x | [SU(3)] x",
                "\\newcommand\\SU[1]{\\mathrm{SU}( #1 )}\\emph{of \\SU{3} now} | of SU(3) now",
                "\\section{\\texorpdfstring{$E_6$}{E6}} | E_6",
                "see \\cite[p.~3]{abc} there | see there",
            })
    void flattened(String latex, String expected) {
        assertEquals(expected, Reader.flatten(latex).text().strip());
    }

    @Test
    void everyCharacterKnowsItsOrigin() {
        String latex = "Under $\\mathrm{SU}(3)$:";
        PlainText plain = Reader.flatten(latex);
        int at = plain.text().indexOf("SU(3)");
        assertEquals("SU}(3)", plain.origin(at, at + 5).of(latex));
    }
}
