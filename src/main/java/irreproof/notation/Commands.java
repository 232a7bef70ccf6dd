package irreproof.notation;

import irreproof.notation.Expression.PowerKind;
import irreproof.notation.Relation.Kind;
import irreproof.notation.parser.StatementParser;
import java.util.HashMap;
import java.util.Map;

/** What the control words mean inside a statement; a word that is not listed is unreadable. */
final class Commands {
    /** What to do with a control word. */
    sealed interface Meaning {}

    /** Leave it out, with its arguments (star and optional ones too). */
    record Dropped(int arguments) implements Meaning {}

    /** Leave out the first arguments (and optional ones) and read the last one as if it stood alone. */
    record Wrapper(int before) implements Meaning {}

    /** A brace under or over a formula, with a remark behind it as a script. */
    record Braced() implements Meaning {}

    /** Leave it out with the length or number behind it, in braces or not. */
    record DroppedDimension() implements Meaning {}

    /** The rest of the display is its number. */
    record EquationNumber() implements Meaning {}

    /** Text between rows: ends a statement. */
    record Interruption() implements Meaning {}

    /** Text. */
    record Text() implements Meaning {}

    /** A lexeme without content. */
    record Single(int type) implements Meaning {}

    /** A relation sign. */
    record Related(Kind kind, boolean negated) implements Meaning {}

    /** An arrow that carries text in its arguments. */
    record LongArrow() implements Meaning {}

    /** Remarks over or under a sign, which is the last argument. */
    record Stacked(int remarks) implements Meaning {}

    /** Sets its argument's face. */
    record Faced(Expression.Face face) implements Meaning {}

    /** Sets the face up to the end of the group. */
    record FaceSwitch(Expression.Face face) implements Meaning {}

    /** A bar over its argument. */
    record Bar() implements Meaning {}

    record FractionOf() implements Meaning {}

    /** Reads as a power if an exponent follows. */
    record PowerHead(PowerKind kind) implements Meaning {}

    record Prime() implements Meaning {}

    record Star() implements Meaning {}

    record Negation() implements Meaning {}

    /** {@code \left}, {@code \big}: the delimiter follows. */
    record Delimiter() implements Meaning {}

    record Space() implements Meaning {}

    record Young(YoungReader.Form form) implements Meaning {}

    record Environment(boolean begin) implements Meaning {}

    record PhysicsBrackets() implements Meaning {}

    private static final Map<String, Meaning> TABLE = new HashMap<>();

    private Commands() {}

    /** The meaning of a control word, or null if it has none here. */
    static Meaning of(String word) {
        return TABLE.get(word);
    }

    private static void put(Meaning meaning, String words) {
        for (String word : words.split(" ")) {
            TABLE.put(word, meaning);
        }
    }

    static {
        operators();
        relations();
        styles();
        noise();
    }

    private static void operators() {
        put(new Single(StatementParser.OPLUS), "oplus bigoplus");
        put(new Single(StatementParser.OTIMES), "otimes");
        put(new Single(StatementParser.TIMES), "times");
        put(new Single(StatementParser.CDOT), "cdot");
        put(new Single(StatementParser.PLUS_MINUS), "pm mp");
        put(
                new Single(StatementParser.DOTS),
                "dots ldots cdots dotsc dotsb dotsm dotsi dotso hdots mathellipsis textellipsis");
        put(new Single(StatementParser.COMMA), "comma");
        put(new Single(StatementParser.ROUND_OPEN), "lparen");
        put(new Single(StatementParser.ROUND_CLOSE), "rparen");
        put(new Single(StatementParser.SQUARE_OPEN), "lbrack");
        put(new Single(StatementParser.SQUARE_CLOSE), "rbrack");
        put(new Single(StatementParser.CURLY_OPEN), "lbrace");
        put(new Single(StatementParser.CURLY_CLOSE), "rbrace");
        put(new FractionOf(), "frac tfrac dfrac cfrac nicefrac sfrac slashfrac flatfrac");
        put(new PowerHead(PowerKind.EXTERIOR), "Lambda wedge bigwedge Alt");
        put(new PowerHead(PowerKind.SYMMETRIC), "Sym vee bigvee odot bigodot");
        put(new PowerHead(PowerKind.TENSOR), "bigotimes");
        put(new Prime(), "prime");
        put(new Star(), "ast star");
        put(new Young(YoungReader.Form.YNG), "yng");
        put(new Young(YoungReader.Form.YOUNG), "young");
        put(new Young(YoungReader.Form.YDIAGRAM), "ydiagram");
        put(new Young(YoungReader.Form.SHORT), "ytableaushort");
        put(new Young(YoungReader.Form.SINGLET), "bullet");
    }

    private static void relations() {
        put(new Related(Kind.EQUAL, false), "cong simeq equiv coloneqq doteq isomorphic");
        put(new Related(Kind.ARROW, false), "sim");
        put(new Related(Kind.EQUAL, true), "neq ne ncong nsim nequiv nsimeq");
        put(
                new Related(Kind.ARROW, false),
                "to rightarrow longrightarrow mapsto longmapsto hookrightarrow rightsquigarrow leadsto");
        put(new Related(Kind.ARROW, true), "nrightarrow");
        put(new Related(Kind.CONTAINS, false), "ni owns supset supseteq supsetneq");
        put(new Related(Kind.CONTAINS, true), "nsupseteq notni");
        put(new Related(Kind.CONTAINED, false), "in subset subseteq subsetneq");
        put(new Related(Kind.CONTAINED, true), "notin nsubseteq");
        put(new LongArrow(), "xrightarrow xlongrightarrow xmapsto");
        put(new Stacked(1), "overset stackrel underset");
        put(new Stacked(2), "overunderset underoverset");
        put(new Negation(), "not");
        put(
                new Single(StatementParser.BREAK),
                "Rightarrow Longrightarrow implies iff Leftrightarrow Longleftrightarrow leftrightarrow longleftrightarrow"
                        + " leftarrow longleftarrow gets Leftarrow Longleftarrow impliedby approx propto le leq ge geq ll gg"
                        + " lt gt colon therefore because mid par Longmapsto");
        put(new EquationNumber(), "eqno leqno");
        put(new Interruption(), "intertext shortintertext");
    }

    private static void styles() {
        put(new Faced(Expression.Face.BOLD), "mathbf bm boldsymbol symbf pmb textbf mathbfup symbfup bold mathbfsf");
        put(new Faced(Expression.Face.UNDERLINED), "underline");
        put(new Faced(Expression.Face.PLAIN), "mathrm mathit mathsf mathnormal symup symrm symsf symit operatorname");
        put(new FaceSwitch(Expression.Face.BOLD), "bf bfseries boldmath");
        put(new FaceSwitch(Expression.Face.PLAIN), "rm rmfamily mdseries unboldmath normalfont");
        put(new Bar(), "bar overline widebar wb");
        put(new Braced(), "underbrace overbrace underbracket overbracket");
        put(new Text(), "text textrm textnormal textit textsf texttt textup textsc mbox hbox mathtext qqtext qq");
        put(new PhysicsBrackets(), "pqty bqty");
        put(
                new Wrapper(0),
                "boxed fbox mathop mathrel mathbin mathord mathopen mathclose mathinner mathpunct ensuremath vcenter smash"
                        + " mathclap mathrlap mathllap rlap llap clap cramped"
                        + " framebox");
        put(new Wrapper(1), "textcolor mathcolor raisebox scalebox colorbox adjustbox rotatebox");
        put(new Wrapper(2), "resizebox multicolumn fcolorbox multirow");
    }

    private static void noise() {
        put(
                new Dropped(0),
                "displaystyle textstyle scriptstyle scriptscriptstyle nonumber notag limits nolimits tiny scriptsize"
                        + " footnotesize small normalsize large Large centering hfill hfil hline protect relax noindent"
                        + " strut mathstrut allowbreak nobreak linebreak nolinebreak break displaybreak pagebreak"
                        + " bigstrut qed qedhere footnotemark null");
        put(
                new Dropped(1),
                "label tag color phantom hphantom vphantom hspace vspace mspace footnote cite citep citet ref eqref"
                        + " ytableausetup Ylinethick Yfillcolour Yfillcolor Ylinecolour Ylinecolor cline"
                        + " addlinespace noalign index marginpar todo");
        put(
                new DroppedDimension(),
                "hskip vskip kern mkern mskip Yboxdim Yvcentermath Yautoscale Ystdtext Ynodecimal Yinterspace");
        put(new Dropped(2), "setlength addtolength cmidrule");
        put(
                new Delimiter(),
                "left right middle big Big bigg Bigg bigl bigr Bigl Bigr biggl biggr Biggl Biggr bigm Bigm biggm Biggm qty");
        put(new Space(), "thinspace medspace thickspace negthinspace negmedspace enspace enskip space nobreakspace");
        put(new Single(StatementParser.SOFT_BREAK), "quad qquad cr newline tabularnewline");
        put(new Environment(true), "begin");
        put(new Environment(false), "end");
    }
}
