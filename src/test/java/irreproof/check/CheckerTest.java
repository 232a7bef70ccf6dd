package irreproof.check;

import static irreproof.check.Fixture.checks;
import static irreproof.check.Fixture.only;
import static irreproof.check.Fixture.report;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CheckerTest {
    /** Products every textbook has: common practice; SU(3) also in the PDG review of SU(n) multiplets. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) | 3\\otimes\\bar 3=8\\oplus1",
                "SU(3) | \\mathbf{8}\\otimes\\mathbf{8}=\\mathbf{27}\\oplus\\mathbf{10}\\oplus\\overline{\\mathbf{10}}\\oplus 2\\,\\mathbf{8}\\oplus\\mathbf{1}",
                "SU(3) | (1,0)\\otimes(2,0)=(3,0)\\oplus(1,1)",
                "E_8 | S^2(248)=1\\oplus3875\\oplus27000",
                "SU(3) | (3)\\otimes(\\bar 3)=(8)\\oplus(1)",
                "SO(7) | (\\mathbf 7)\\otimes(\\mathbf 7)=(\\mathbf 1)\\oplus(\\mathbf{21})\\oplus(\\mathbf{27})",
                "SO(10) | (01000)\\otimes(01000)=(00000)\\oplus(01000)\\oplus(20000)\\oplus(00011)\\oplus(02000)\\oplus(10100)",
                "SU(5) | [1000]\\otimes[1000]=[0100]\\oplus[2000]",
                "SU(4) | (101)\\otimes(101)=(000)\\oplus2\\,(101)\\oplus(020)\\oplus(210)\\oplus(012)\\oplus(202)",
                "SU(3) | (10)\\otimes(01)=(11)\\oplus(00)",
                "SU(3) | \\yng(1)\\otimes\\yng(1,1)=\\yng(2,1)\\oplus\\yng(1,1,1)",
                "SU(3) | \\mathbf{3}^{\\otimes3}=\\mathbf{10}\\oplus\\mathbf{8}\\oplus\\mathbf{8}\\oplus\\mathbf{1}",
                "SU(3) | 3\\otimes(6\\oplus\\bar 3)=10\\oplus8\\oplus8\\oplus1",
                "SU(3) | 8\\otimes8=1\\oplus8\\oplus\\dots",
                "SU(3) | 3\\otimes\\bar 3\\ni1",
                "SU(3) | 6\\otimes\\bar 3\\not\\ni1",
                "SU(3) | \\Lambda^2\\mathbf{3}=\\bar{\\mathbf{3}}",
                "SU(2) | 1\\otimes1=2\\oplus1\\oplus0",
                "SU(2) | \\tfrac12\\otimes1=\\tfrac32\\oplus\\tfrac12",
                "SU(2) | 2\\otimes2=3\\oplus1",
                "SU(5) | [2]\\otimes[1,1]=[2,1,1]\\oplus[3,1]",
                "SO(10) | \\mathbf{16}\\otimes\\overline{\\mathbf{16}}=\\mathbf{1}\\oplus\\mathbf{45}\\oplus\\mathbf{210}",
                "SO(8) | 8_s\\otimes8_s=1\\oplus28\\oplus35_s",
                "SO(8) | \\mathbf{8_v}\\otimes\\mathbf{8_v}=[0]\\oplus[2]\\oplus(2)",
                "G_2 | 7\\otimes7=1\\oplus7\\oplus14\\oplus27",
            })
    void trueStatementsHold(String group, String latex) {
        StatementReport statement = only(group, latex);
        assertEquals(Verdict.HOLDS, statement.verdict(), statement.reason());
        assertEquals(List.of(), statement.findings());
    }

    /** Each false, with the rule that says so. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SU(3) | 3\\otimes\\bar 3=1\\otimes 8 | dimension-mismatch",
                "SU(3) | 8\\otimes8=27\\oplus10\\oplus\\overline{10}\\oplus8\\oplus1 | dimension-mismatch",
                "SU(3) | \\mathbf{3}\\otimes\\mathbf{3}=\\mathbf{8}\\oplus\\mathbf{1} | congruence-mismatch",
                "SU(3) | 8\\otimes6=15\\oplus24\\oplus3\\oplus6 | congruence-mismatch",
                "SU(3) | \\mathbf{8}\\otimes\\mathbf{8}=\\mathbf{27}\\oplus\\mathbf{27}\\oplus\\mathbf{10} | wrong-decomposition",
                "SU(3) | 3\\otimes3\\ni1 | not-contained",
                "SU(3) | 8\\otimes8=8\\oplus8\\oplus8\\oplus\\dots | not-contained",
                "SU(3) | 3\\otimes\\bar3\\not\\ni1 | wrong-negation",
                "SU(3) | 3\\otimes3=6_A\\oplus\\bar3_S | wrong-symmetry",
                "SU(3) | 3\\otimes3=5\\oplus4 | no-such-irrep",
                "SU(5) | 10\\otimes10=5\\oplus45\\oplus50 | congruence-mismatch",
                "SU(2) | \\tfrac12\\otimes\\tfrac12=0\\otimes1 | dimension-mismatch",
                "E_6 | 27\\otimes27=\\overline{27}\\oplus351\\oplus351 | wrong-decomposition",
            })
    void falseStatementsFail(String group, String latex, String rule) {
        StatementReport statement = only(group, latex);
        assertEquals(Verdict.FAILS, statement.verdict(), statement.reason());
        assertEquals(
                List.of(rule), statement.findings().stream().map(Finding::rule).toList());
    }

    @Test
    void readsOtherConventionsWithAdvice() {
        checks("""
                In $SO(10)$ one has $\\mathbf{16}\\otimes\\mathbf{16}=\\mathbf{10}\\oplus\\mathbf{120}\\oplus\\overline{\\mathbf{126}}$.
                                                                                                      ^^^^^^^^^^^^^^^^^^^^^^^ unusual-name
                """);
    }

    @Test
    void findsTheGroupNearby() {
        StatementReport prose = report("In $SU(3)$ we have $3\\otimes\\bar3=8\\oplus1$.\n", "")
                .statements()
                .get(0);
        assertEquals("SU(3)", prose.setting());
        assertEquals(SettingSource.PROSE, prose.settingSource());
        StatementReport heading = report(
                        "\\section{The group $\\mathrm{SU}(3)$}\nThen\n\n\\[3\\otimes\\bar3=8\\oplus1\\]\n", "")
                .statements()
                .get(0);
        assertEquals(SettingSource.HEADING, heading.settingSource());
        StatementReport directive = report("% irreproof: group SU(3)\nIn $SU(5)$, $3\\otimes\\bar3=8\\oplus1$.\n", "")
                .statements()
                .get(0);
        assertEquals(SettingSource.DIRECTIVE, directive.settingSource());
        assertEquals(Verdict.HOLDS, directive.verdict());
    }

    @Test
    void infersTheOnlyGroupInWhichAStatementHolds() {
        StatementReport statement = only(
                "",
                "\\mathbf{7}\\otimes\\mathbf{7}=\\mathbf{1}\\oplus\\mathbf{7}\\oplus\\mathbf{14}\\oplus\\mathbf{27}");
        assertEquals(Verdict.HOLDS, statement.verdict());
        assertEquals("G2", statement.setting());
        assertEquals(SettingSource.INFERRED, statement.settingSource());
    }

    @Test
    void staysUndecidedWhereItCannotKnow() {
        assertEquals(
                Verdict.UNDECIDED,
                only("A_4", "3\\otimes3=1\\oplus1'\\oplus1''\\oplus3\\oplus3").verdict());
        assertEquals(
                Verdict.UNDECIDED,
                only("E_6", "\\mathbf{27}\\to\\mathbf{16}\\oplus\\mathbf{10}\\oplus\\mathbf{1}")
                        .verdict());
        assertEquals(
                Verdict.UNDECIDED,
                only("SU(3)", "\\mathbf{3}\\otimes\\mathbf{3}\\to\\mathbf{6}").verdict());
    }

    /** Sums that continue a product elsewhere agree with each other, but nobody looked at the product. */
    @Test
    void doesNotVouchForARightSideAlone() {
        StatementReport remainder = only("SU(3)", "&=\\mathbf{8}\\oplus\\mathbf{1} = \\mathbf{1}\\oplus\\mathbf{8}");
        assertEquals(Verdict.UNDECIDED, remainder.verdict());
        assertEquals("its left side stands elsewhere", remainder.reason());
        StatementReport field =
                only("SU(3)", "Q\\bar q = \\mathbf{3}\\otimes\\bar{\\mathbf{3}} = \\mathbf{1}\\oplus\\mathbf{8}");
        assertEquals(Verdict.HOLDS, field.verdict());
    }

    @Test
    void directivesSuppressPauseAndComplain() {
        checks("""
                In $SU(3)$:
                % irreproof: allow dimension-mismatch
                $3\\otimes3=6\\oplus6$
                % irreproof: pause
                $3\\otimes3=6\\oplus6$
                % irreproof: resume
                $3\\otimes3=6\\oplus\\bar3$
                % irreproof: allow not-contained
                ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unused-allow
                % irreproof: grup SU(3)
                ^^^^^^^^^^^^^^^^^^^^^^^ unreadable-directive
                $3\\otimes\\bar3=8\\oplus1$
                """);
    }

    /** Sp(3) can only count the rank, and so then does Sp(2): its 4 and 5 are those of Sp(4) elsewhere. */
    @Test
    void readsSymplecticGroupsByTheDocumentsUsage() {
        FileReport ranks = report(
                "Besides $Sp(3)$ there is $Sp(2)$, with $\\mathbf{4}\\otimes\\mathbf{5}=\\mathbf{4}\\oplus\\mathbf{16}$.\n",
                "");
        assertEquals(Verdict.HOLDS, ranks.statements().get(0).verdict());
        assertEquals("Sp(2)", ranks.statements().get(0).setting());
    }

    @Test
    void finiteGroupsNearbyAndDotsAloneDecideNothing() {
        String triplets =
                "$\\mathbf3\\otimes\\mathbf3=\\bar{\\mathbf3}\\oplus\\bar{\\mathbf3}\\oplus\\bar{\\mathbf3}$.\n";
        assertEquals(
                List.of(),
                report("The finite group $\\Delta(27)\\subset SU(3)$ acts.\n\nHere " + triplets, "")
                        .allFindings());
        assertEquals(
                List.of(),
                report("\\section{$\\Delta(27)$}\nA subgroup of $SU(3)$: " + triplets, "")
                        .allFindings());
        FileReport psl = report("The group $PSL(2,7)$ has $3\\otimes8=3\\oplus\\bar6\\oplus15$.\n", "");
        assertEquals(Verdict.UNDECIDED, psl.statements().get(0).verdict());
        assertEquals(
                Verdict.UNDECIDED,
                only("SU(3)", "\\mathbf6\\otimes\\mathbf6=\\ldots").verdict());
    }

    @Test
    void declaredNamesAreTaken() {
        checks("""
                % irreproof: name 126 = (0,0,0,2,0)
                In $SO(10)$, $\\mathbf{16}\\otimes\\mathbf{16}=\\mathbf{10}\\oplus\\mathbf{120}\\oplus\\overline{\\mathbf{126}}$.
                """);
    }

    @Test
    void theFixMendsTheStatement() {
        String source =
                "In $SU(3)$, $\\rep{8}\\otimes\\rep{8}=\\rep{27}\\oplus\\rep{10}\\oplus\\bar{\\rep{10}}\\oplus\\rep{8}\\oplus\\rep{1}$.\n";
        Map<String, String> files = Map.of("m", "\\newcommand{\\rep}[1]{\\mathbf{#1}}");
        FileReport before = report("\\input{m}" + source, "", files);
        Finding finding = before.allFindings().get(0);
        String mended = irreproof.text.TextEdit.apply(
                before.source().content(), finding.fixes().get(0).edits());
        FileReport after = report(mended, "", files);
        assertEquals(List.of(), after.allFindings(), mended);
        assertEquals(Verdict.HOLDS, after.statements().get(0).verdict());
        assertTrue(mended.contains("\\rep{8}\\oplus\\rep{8}") || mended.contains("2\\,\\rep{8}"), mended);
    }

    /** What tells nothing wrong from wrong only by its context: silence is right. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "the group $SU(3)$ | \\mathbf{3}\\otimes\\bar{\\mathbf{3}}=\\mathbf{1}",
                "the group $SU(3)$ | 3\\otimes3=9",
                "the group $SU(3)$ | \\mathbf{3}\\otimes\\mathbf{3}\\sim\\mathbf{6}\\oplus\\mathbf{1}",
                "the group $SU(3)$ | \\mathbf{3}\\otimes\\mathbf{3}\\overset{\\text{sym}}{=}\\mathbf{6}",
                "the group $SU(3)$ | 3\\otimes3^c=1\\oplus8",
                "the group $SU(3)$ | 8\\otimes8=1\\oplus8\\oplus27",
                "the group $SU(2)$ | \\tfrac52\\otimes\\tfrac52=0\\oplus2\\oplus4",
                "the group $SU(2)$ | \\mathbf{3}\\otimes\\bar{\\mathbf{3}}=\\mathbf{1}\\oplus\\mathbf{8}",
                "the group $SU(2)$ | 2\\otimes2'=4",
                "$\\Delta(27)$, a subgroup of $SU(3)$ | \\mathbf3\\otimes\\mathbf3=\\bar{\\mathbf3}\\oplus\\bar{\\mathbf3}\\oplus\\bar{\\mathbf3}",
                "$A_5$, a subgroup of $SO(3)$ | \\mathbf5\\otimes\\mathbf3=\\mathbf3\\oplus\\mathbf3'\\oplus\\mathbf4\\oplus\\mathbf5",
                "the group $G_2$ | 7\\otimes7=(1\\oplus3\\oplus\\bar3)\\otimes(1\\oplus3\\oplus\\bar3)",
                "tropical numbers | 2\\otimes(3\\oplus4)=5",
            })
    void staysSilent(String about, String latex) {
        FileReport report = report("For " + about + " we have $" + latex + "$.\n", "");
        assertEquals(List.of(), report.allFindings());
    }
}
