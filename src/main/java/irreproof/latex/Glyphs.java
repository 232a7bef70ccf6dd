package irreproof.latex;

import java.util.HashMap;
import java.util.Map;

/** What a reader sees of the commands that show something in flattened text. */
final class Glyphs {
    /** Arguments of these commands are not seen: {@code o} optional, {@code m} mandatory. */
    private static final Map<String, String> UNSEEN = new HashMap<>();

    private static final Map<String, String> SHOWN = new HashMap<>();

    static {
        shown("×", "times");
        shown(
                "→",
                "to rightarrow longrightarrow xrightarrow hookrightarrow longmapsto mapsto Rightarrow "
                        + "Longrightarrow implies leadsto rightsquigarrow twoheadrightarrow");
        shown("←", "leftarrow longleftarrow gets");
        shown("↔", "leftrightarrow longleftrightarrow");
        shown("⊃", "supset supseteq supsetneq Supset");
        shown("⊂", "subset subseteq subsetneq Subset");
        shown("⊗", "otimes");
        shown("⊕", "oplus bigoplus");
        shown("≅", "cong");
        shown("≃", "simeq");
        shown("∼", "sim");
        shown("≈", "approx");
        shown("≡", "equiv");
        shown("∈", "in");
        shown("∋", "ni");
        shown("⋊", "rtimes");
        shown("⋉", "ltimes");
        shown("·", "cdot");
        shown("±", "pm");
        shown("∧", "wedge");
        shown("*", "ast");
        shown("'", "prime");
        shown("…", "dots ldots cdots");
        shown("/", "slash");
        shown(
                " ",
                "quad qquad enspace thinspace medspace thickspace space hfill hspace vspace par item newline "
                        + "linebreak cr tabularnewline hline nobreakspace");
        String[] greek =
                ("alpha α beta β gamma γ delta δ epsilon ε varepsilon ε zeta ζ eta η theta θ vartheta θ iota ι "
                                + "kappa κ lambda λ mu μ nu ν xi ξ pi π rho ρ sigma σ tau τ upsilon υ phi φ varphi φ chi χ psi ψ "
                                + "omega ω Gamma Γ Delta Δ Theta Θ Lambda Λ Xi Ξ Pi Π Sigma Σ Upsilon Υ Phi Φ Psi Ψ Omega Ω")
                        .split(" ");
        for (int i = 0; i < greek.length; i += 2) {
            SHOWN.put(greek[i], greek[i + 1]);
        }
        // groups and fields under the names that widely used packages and authors' private styles give them
        for (String group : "SU SO Sp USp Spin Pin SL GL PSL PSU SP su usp U C R Z N Q".split(" ")) {
            SHOWN.put(group, group);
        }
        SHOWN.put("specialUnitary", "SU");
        SHOWN.put("specialUnitaryLie", "su");
        SHOWN.put("specialOrthogonal", "SO");
        SHOWN.put("specialOrthogonalLie", "so");
        SHOWN.put("symplectic", "Sp");
        SHOWN.put("symplecticLie", "sp");
        SHOWN.put("unitary", "U");
        SHOWN.put("unitaryLie", "u");
        unseen(
                "m",
                "label ref eqref cref Cref autoref pageref nameref hypertarget bibliography bibliographystyle "
                        + "pagestyle thispagestyle vskip phantom hphantom vphantom graphicspath setcounter color index "
                        + "tikzset newtheorem theoremstyle newcounter affiliation email pacs preprint vspace hspace "
                        + "bibitem tag ytableausetup");
        unseen(
                "om",
                "xrightarrow xleftarrow cite citep citet citealp parencite textcite footcite autocite includegraphics usetikzlibrary");
        unseen("mm", "addtocounter setlength addtolength newlength");
        unseen("omm", "multicolumn");
        unseen("o", "linebreak pagebreak maketitle");
        unseen("m", "overset underset stackrel textcolor colorbox fontsize");
    }

    private Glyphs() {}

    private static void shown(String glyph, String words) {
        for (String word : words.split(" ")) {
            SHOWN.put(word, glyph);
        }
    }

    private static void unseen(String arguments, String words) {
        for (String word : words.split(" ")) {
            UNSEEN.put(word, arguments);
        }
    }

    /** What the command shows, or null for nothing. */
    static String shown(String word) {
        return SHOWN.get(word);
    }

    static String unseenArguments(String word) {
        return UNSEEN.getOrDefault(word, "");
    }
}
