package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.engine.Rational;
import java.math.BigInteger;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Published dimensions, indices, Casimirs, anomalies, classes and realities; the source stands in each row. */
class InvariantsTest {
    @Test
    void agreesWithThePublishedInvariants() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("invariants.tsv")) {
            var found = Published.algebra(row.get("group"));
            if (found.isEmpty()) {
                continue;
            }
            SimpleAlgebra algebra = found.get();
            DominantWeight weight = Published.weight(algebra, row.get("dynkin_bourbaki"));
            assertEquals(
                    row.get("dim"), WeylDimension.dimension(algebra, weight).toString(), row::toString);
            BigInteger index = Invariants.dynkinIndex(algebra, weight);
            assertEquals(row.get("index_l (Slansky: fund SU(N)=1, SO(N) vector=2)"), index.toString(), row::toString);
            assertEquals(row.get("T=l/2"), new Rational(index, BigInteger.TWO).toString(), row::toString);
            String casimir = "C2 (long root^2=2, half normalisation: SU(N) fund=(N^2-1)/2N)";
            assertEquals(
                    row.get(casimir),
                    Invariants.quadraticCasimir(algebra, weight).toString(),
                    row::toString);
            if (algebra.series() == Series.A) {
                String anomaly = Invariants.cubicAnomaly(algebra, weight).toString();
                assertEquals(row.get("cubic_anomaly (fund=1)"), anomaly, row::toString);
            }
            assertEquals(
                    row.get("congruence_class"),
                    CongruenceClass.of(algebra, weight).toString(),
                    row::toString);
            assertEquals(row.get("reality"), reality(algebra, weight), row::toString);
            checked++;
        }
        assertEquals(134, checked);
    }

    @Test
    void agreesWithThePublishedLabels() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("labels.tsv")) {
            SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
            DominantWeight weight = Published.weight(algebra, row.get("dynkin_bourbaki"));
            assertEquals(
                    row.get("dim"), WeylDimension.dimension(algebra, weight).toString(), row::toString);
            assertEquals(
                    row.get("index_slansky"),
                    Invariants.dynkinIndex(algebra, weight).toString(),
                    row::toString);
            assertEquals(row.get("class"), CongruenceClass.of(algebra, weight).toString(), row::toString);
            assertEquals(row.get("reality"), reality(algebra, weight), row::toString);
            checked++;
        }
        assertEquals(265, checked);
    }

    private static String reality(SimpleAlgebra algebra, DominantWeight weight) {
        return Invariants.reality(algebra, weight).name().toLowerCase(Locale.ROOT);
    }

    /** The adjoint irrep has index and Casimir 2h and h, h the dual Coxeter number (Bourbaki, plates; Kac 1990, table). */
    @Test
    void theAdjointShowsTheDualCoxeterNumber() {
        Map.of(
                        new SimpleAlgebra(Series.A, 7), 8,
                        new SimpleAlgebra(Series.B, 5), 9,
                        new SimpleAlgebra(Series.C, 6), 7,
                        new SimpleAlgebra(Series.D, 9), 16,
                        new SimpleAlgebra(Series.E, 6), 12,
                        new SimpleAlgebra(Series.E, 7), 18,
                        new SimpleAlgebra(Series.E, 8), 30,
                        new SimpleAlgebra(Series.F, 4), 9,
                        new SimpleAlgebra(Series.G, 2), 4)
                .forEach((algebra, coxeter) -> {
                    DominantWeight adjoint = RootSystem.of(algebra).highestRoot();
                    assertEquals(BigInteger.valueOf(algebra.dimension()), WeylDimension.dimension(algebra, adjoint));
                    assertEquals(Rational.of(coxeter), Invariants.quadraticCasimir(algebra, adjoint));
                    assertEquals(BigInteger.valueOf(2L * coxeter), Invariants.dynkinIndex(algebra, adjoint));
                    assertEquals(Reality.REAL, Invariants.reality(algebra, adjoint));
                });
    }

    /** The closed forms in orthogonal coordinates against the inverse Cartan matrix. */
    @Test
    void theCasimirAgreesWithTheQuadraticForm() {
        for (SimpleAlgebra algebra : Algebras.upToRank(9)) {
            RootSystem system = RootSystem.of(algebra);
            for (int i = 0; i < algebra.rank(); i++) {
                int[] labels = new int[algebra.rank()];
                labels[i] = 1 + i % 2;
                labels[0] += 1;
                long[] weight = new long[algebra.rank()];
                long[] plusTwo = new long[algebra.rank()];
                for (int j = 0; j < weight.length; j++) {
                    weight[j] = labels[j];
                    plusTwo[j] = labels[j] + 2;
                }
                Rational expected = Rational.of(system.form(weight, plusTwo), 2 * system.formDenominator());
                assertEquals(expected, Invariants.quadraticCasimir(algebra, DominantWeight.of(labels)));
            }
        }
    }

    @Test
    void hugeRanksHaveClosedForms() {
        SimpleAlgebra algebra = new SimpleAlgebra(Series.A, 999);
        int[] labels = new int[999];
        labels[0] = 2;
        DominantWeight weight = DominantWeight.of(labels);
        assertEquals(BigInteger.valueOf(500500), WeylDimension.dimension(algebra, weight));
        assertEquals(BigInteger.valueOf(1002), Invariants.dynkinIndex(algebra, weight));
        assertEquals(BigInteger.valueOf(1004), Invariants.cubicAnomaly(algebra, weight));
        assertTrue(CongruenceClass.of(algebra, weight).value() == 2);
    }

    /** Both normalisations are common practice; the columns l and T of invariants.tsv hold each row's source. */
    @Test
    void theNormalisationOfTheIndexCanBeChosen() {
        int checked = 0;
        for (java.util.Map<String, String> row : Published.rows("invariants.tsv")) {
            java.util.Optional<SimpleAlgebra> found = Published.algebra(row.get("group"));
            if (found.isEmpty() || row.get("dynkin_bourbaki").isEmpty()) {
                continue;
            }
            SimpleAlgebra algebra = found.get();
            DominantWeight irrep = Published.weight(algebra, row.get("dynkin_bourbaki"));
            Rational half = Invariants.dynkinIndex(algebra, irrep, IndexNormalisation.FUNDAMENTAL_HALF);
            Rational one = Invariants.dynkinIndex(algebra, irrep, IndexNormalisation.FUNDAMENTAL_ONE);
            assertEquals(row.get("T=l/2"), half.toString(), row::toString);
            assertEquals(half.times(Rational.of(2)), one, row::toString);
            for (IndexNormalisation normalisation : IndexNormalisation.values()) {
                Rational casimir = Invariants.quadraticCasimir(algebra, irrep, normalisation);
                assertEquals(
                        Invariants.dynkinIndex(algebra, irrep, normalisation).times(Rational.of(algebra.dimension())),
                        casimir.times(Rational.of(WeylDimension.dimension(algebra, irrep))),
                        row::toString);
            }
            checked++;
        }
        assertEquals(134, checked);
    }
}
