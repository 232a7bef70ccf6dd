// One side of a statement about representations: what stands between two relation signs, after the noise of typesetting
// has been taken out. The tokens come from irreproof.notation.Lowering, which reads numbers, diagrams and scripts; this
// grammar says how they combine. It is LL(1): every choice is made by the next token.
parser grammar StatementParser;

tokens {
    // operands
    NUMBER, FRACTION, DIAGRAM, DOTS,
    // operators
    OPLUS, PLUS, MINUS, PLUS_MINUS, OTIMES, TIMES, CDOT, SLASH, COMMA, SEMICOLON,
    // brackets: those that print, and TeX's own; BAR_OPEN opens what stands under a bar
    ROUND_OPEN, ROUND_CLOSE, SQUARE_OPEN, SQUARE_CLOSE, CURLY_OPEN, CURLY_CLOSE,
    GROUP_OPEN, BAR_OPEN, GROUP_CLOSE,
    // what is attached to an operand: a subscript, primes, stars, an exponent, any other superscript; a prefix is \Lambda^2
    SUBSCRIPT, PRIMES, STARS, EXPONENT, SUPERSCRIPT, PREFIX,
    // never inside a side, or never readable in one
    RELATION, BREAK, SOFT_BREAK, WORDS, UNREADABLE
}

side
    : sum EOF
    ;

sum
    : product ((OPLUS | PLUS) product)*
    ;

product
    : factor (times factor)*
    ;

times
    : OTIMES
    | TIMES
    ;

// Operands side by side: a multiplicity and what it counts (2\,\mathbf{8}, 2\cdot\mathbf{8}), a name and its charge
// (16(1)), Dynkin labels set apart by spaces ((1\,0)). Which of these is meant depends on the faces, not on the order.
factor
    : operand (CDOT? operand)*
    ;

operand
    : PREFIX operand
    | atom mark*
    ;

atom
    : number
    | DIAGRAM
    | DOTS
    | group
    | brackets
    ;

number
    : NUMBER (SLASH NUMBER)?
    | FRACTION
    ;

group
    : (GROUP_OPEN | BAR_OPEN) sum GROUP_CLOSE
    ;

brackets
    : ROUND_OPEN entries ROUND_CLOSE
    | SQUARE_OPEN entries SQUARE_CLOSE
    | CURLY_OPEN sum CURLY_CLOSE
    ;

entries
    : entry ((COMMA | SEMICOLON) entry)*
    ;

// An entry may be a bare sign (a charge) or nothing at all ((3,2,,\frac16)).
entry
    : sign? sum
    | sign
    |
    ;

sign
    : PLUS
    | MINUS
    | PLUS_MINUS
    ;

mark
    : SUBSCRIPT
    | PRIMES
    | STARS
    | EXPONENT
    | SUPERSCRIPT
    ;
