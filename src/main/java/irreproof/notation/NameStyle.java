package irreproof.notation;

/**
 * How dimension names are written.
 *
 * @param plain the spelling without a bar
 * @param narrow the spelling of one digit with a bar
 * @param wide the spelling of more digits with a bar
 * @param star what marks a conjugate behind the name instead of a bar ({@code ^*}); empty if bars do
 * @param primesInside true if primes stand inside the styling
 * @param primeCommand true if they are written {@code ^\prime}
 * @param labelInside true if subscripts that belong to the name stand inside the styling
 * @param labelOpen the text in front of such a subscript's letter
 * @param labelClose the text behind it
 * @param styling where the digits' bold face comes from
 */
record NameStyle(
        Spelling plain,
        Spelling narrow,
        Spelling wide,
        String star,
        boolean primesInside,
        boolean primeCommand,
        boolean labelInside,
        String labelOpen,
        String labelClose,
        Styling styling) {
    static final NameStyle STANDARD = of(Spelling.of("\\mathbf{"));

    /** The usual habits around one spelling. */
    static NameStyle of(Spelling plain) {
        return new NameStyle(
                plain, plain.barred(false), plain.barred(true), "", false, false, false, "_", "", Styling.EACH);
    }

    /** Where a face comes from. */
    enum Styling {
        /** Plain digits. */
        NONE,
        /** Each name carries its own styling. */
        EACH,
        /** A switch in front of the whole formula sets everything, counts too. */
        SWITCHED
    }

    String write(WrittenTerm.Dimension name) {
        String digits = name.dimension().toString();
        boolean starred = name.bars() > 0 && !star.isEmpty();
        Spelling barred = digits.length() == 1 ? narrow : wide;
        Spelling spelling = name.bars() > 0 && !starred ? barred : plain;
        String primes = primes(name.primes(), starred && !primesInside);
        String label = name.label().isEmpty() ? "" : label(name.label());
        StringBuilder inside = new StringBuilder();
        StringBuilder outside = new StringBuilder();
        (primesInside ? inside : outside).append(primes);
        (labelInside ? inside : outside).append(label);
        if (starred) {
            outside.append(star);
        }
        StringBuilder text = new StringBuilder(spelling.write(digits, inside.toString(), outside.toString()));
        for (int more = name.bars(); more > 1; more--) {
            text.insert(0, "\\bar{").append('}');
        }
        return text.toString();
    }

    private String primes(int count, boolean beforeStar) {
        if (count == 0) {
            return "";
        }
        if (!primeCommand || beforeStar) {
            return "'".repeat(count);
        }
        return count == 1 ? "^\\prime" : "^{" + "\\prime".repeat(count) + "}";
    }

    private String label(String label) {
        boolean group = label.length() > 1 && labelClose.isEmpty();
        return group ? labelOpen + "{" + label + "}" : labelOpen + label + labelClose;
    }
}
