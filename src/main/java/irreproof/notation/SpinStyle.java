package irreproof.notation;

/**
 * How spins are written.
 *
 * @param whole the spelling of whole spins
 * @param half the spelling of what stands around a half-integral spin
 * @param command the fraction command without its backslash, or empty for {@code 1/2}
 * @param braces true if the command's arguments are always in braces
 */
record SpinStyle(Spelling whole, Spelling half, String command, boolean braces, boolean isStyled) {
    static final SpinStyle STANDARD = new SpinStyle(Spelling.PLAIN, Spelling.PLAIN, "tfrac", true, false);

    String write(int doubled) {
        if (doubled % 2 == 0) {
            return whole.write(String.valueOf(doubled / 2), "", "");
        }
        String numerator = String.valueOf(doubled);
        if (command.isEmpty()) {
            return half.write(numerator, "/2", "");
        }
        boolean digits = !braces && numerator.length() == 1;
        String fraction = digits ? "\\" + command + numerator + "2" : "\\" + command + "{" + numerator + "}{2}";
        return new Spelling(half.prefix(), false).write(fraction, "", "");
    }
}
