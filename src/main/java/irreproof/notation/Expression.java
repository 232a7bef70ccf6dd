package irreproof.notation;

import irreproof.text.Span;
import java.math.BigInteger;
import java.util.List;

/**
 * The syntax tree of one side of a statement. It says what is written, not what it means: whether {@code (1,0)} is a
 * pair of Dynkin labels or an irrep of a product group is for the check layer to decide.
 */
public sealed interface Expression {
    Span span();

    /** The expressions it is made of, left to right; none for a name or dots. */
    default List<Expression> parts() {
        return List.of();
    }

    /** Terms joined by {@code \oplus} or {@code +}; two or more. */
    record Sum(List<Expression> terms, Span span) implements Expression {
        public Sum {
            terms = List.copyOf(terms);
        }

        @Override
        public List<Expression> parts() {
            return terms;
        }
    }

    /** Factors joined by {@code \otimes} or {@code \times}; two or more. */
    record Product(List<Expression> factors, Span span) implements Expression {
        public Product {
            factors = List.copyOf(factors);
        }

        @Override
        public List<Expression> parts() {
            return factors;
        }
    }

    /** {@code 2\,\mathbf{8}}, {@code 2\cdot\mathbf{8}}, {@code 2\times\mathbf{8}}, {@code 2(1,1)}; the count may be 0. */
    record Multiple(BigInteger count, Expression body, Span span) implements Expression {
        @Override
        public List<Expression> parts() {
            return List.of(body);
        }
    }

    /** {@code \mathbf{3}^{\otimes 3}}, {@code \Lambda^2\mathbf{5}}, {@code \mathrm{Sym}^2(\mathbf{3})}. */
    record Power(Expression base, PowerKind kind, int exponent, Span span) implements Expression {
        @Override
        public List<Expression> parts() {
            return List.of(base);
        }
    }

    /** {@code (\mathbf{3}\otimes\mathbf{3})_S}: the symmetric or antisymmetric part of a square. */
    record Part(Expression body, Symmetry symmetry, Span span) implements Expression {
        @Override
        public List<Expression> parts() {
            return List.of(body);
        }
    }

    /** A bar over something larger than one name: {@code \overline{\mathbf{3}\oplus\mathbf{6}}}. */
    record Conjugate(Expression body, Span span) implements Expression {
        @Override
        public List<Expression> parts() {
            return List.of(body);
        }
    }

    /** {@code \dots} and its kin: further terms that the author did not write. */
    record Dots(Span span) implements Expression {}

    /** How an author writes one irrep. */
    sealed interface Name extends Expression {
        Decoration decoration();
    }

    /**
     * A number: a dimension name, a spin, or a highest weight. {@code \overline{\mathbf{10}}}, {@code 15'},
     * {@code 8_v}, {@code 3/2}.
     *
     * @param denominator 1 for a whole number, 2 for a half-integral spin; inside a list, where a charge can stand, any
     *     other, and the numerator may be negative
     */
    record NumberName(BigInteger numerator, int denominator, Face face, Decoration decoration, Span span)
            implements Name {}

    /**
     * Entries in brackets: Dynkin labels, a partition, column lengths, an irrep of a product group, with or without
     * charges. {@code (1,0)}, {@code [2,1^2]} (an exponent is a {@link Power}), {@code (\mathbf{3},\bar{\mathbf{2}})};
     * digits without commas {@code (10)} are one {@link NumberName} entry.
     */
    record ListName(Bracket bracket, List<Expression> entries, Decoration decoration, Span span) implements Name {
        public ListName {
            entries = List.copyOf(entries);
        }
    }

    /** A Young diagram by its row lengths, longest first; empty for {@code \bullet} or {@code \cdot}. */
    record DiagramName(List<Integer> rows, Decoration decoration, Span span) implements Name {
        public DiagramName {
            rows = List.copyOf(rows);
        }
    }

    /** Kinds of powers. */
    enum PowerKind {
        TENSOR,
        SYMMETRIC,
        EXTERIOR
    }

    /** A subscript or bracket that says to which part of a square a term belongs. */
    enum Symmetry {
        SYMMETRIC,
        ANTISYMMETRIC
    }

    /** The kind of bracket around a list. */
    enum Bracket {
        ROUND,
        SQUARE
    }

    /** How the digits of a name are set. */
    enum Face {
        PLAIN,
        BOLD,
        UNDERLINED
    }

    /**
     * What is added to a name.
     *
     * @param bars how many bars, stars or daggers-as-bars the name carries
     * @param primes how many primes
     * @param label a subscript that is part of the name ({@code v}, {@code s}, {@code c}, {@code +}, {@code -}), or empty
     * @param symmetry a subscript {@code S}, {@code A}, {@code a}, {@code sym}, {@code antisym}, or null. A subscript that
     *     can also be part of the name ({@code s}) is kept in the label as written; beside a subscript {@code b} an
     *     {@code a} is an index
     * @param charges numbers written as a subscript or in parentheses behind the name, each as plain text ({@code +1/2},
     *     {@code -4}, {@code ±6}); empty if none. Authors also number copies of a name like this ({@code 8_1})
     * @param other any other subscript or superscript, as written (a flavour or field label), or empty
     */
    record Decoration(int bars, int primes, String label, Symmetry symmetry, List<String> charges, String other) {
        public static final Decoration NONE = new Decoration(0, 0, "", null, List.of(), "");

        public Decoration {
            charges = List.copyOf(charges);
        }

        /** True if nothing is added. */
        public boolean isEmpty() {
            return bars == 0
                    && primes == 0
                    && label.isEmpty()
                    && symmetry == null
                    && charges.isEmpty()
                    && other.isEmpty();
        }
    }
}
