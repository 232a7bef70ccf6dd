package irreproof.check;

import irreproof.check.judge.DeclaredNames;
import irreproof.naming.Resolution;
import irreproof.text.Span;

/** What an author tells the tool in a comment that begins with {@code irreproof:}. */
sealed interface Directive {
    /** The comment. */
    Span span();

    /** {@code group SU(5)}: the setting from here on, up to the next such directive. */
    record Group(Resolution group, Span span) implements Directive {}

    /** {@code branching SO(10) -> SU(5) x U(1)}: the setting from here on; not judged yet. */
    record Branching(String written, Span span) implements Directive {}

    /** {@code name 15 = (4,0)}: how a name is to be read in the whole document. */
    record Name(DeclaredNames.Declaration declaration, Span span) implements Directive {}

    /** {@code allow RULE}: the next statement may break the rule. */
    record Allow(String rule, Span span) implements Directive {}

    /** {@code pause}: no statement is checked from here on. */
    record Pause(Span span) implements Directive {}

    /** {@code resume}: statements are checked again. */
    record Resume(Span span) implements Directive {}

    /** One that cannot be read, with what is wrong. */
    record Unreadable(String problem, Span span) implements Directive {}
}
