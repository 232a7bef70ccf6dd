package irreproof.latex;

import irreproof.text.Span;

/** A comment: the text behind the percent sign up to the line end, and its span with the percent sign. */
public record Comment(String text, Span span) {}
