package irreproof.text;

/** A half-open range of UTF-16 offsets into one original text: the only position type inside the program. */
public record Span(int start, int end) {
    public Span {
        if (start < 0 || end < start) {
            throw new IllegalArgumentException("not a span: " + start + ".." + end);
        }
    }

    // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

    @Override
    public boolean equals(Object other) {
        return other instanceof Span that && start == that.start && end == that.end;
    }

    @Override
    public int hashCode() {
        return 31 * start + end;
    }

    public int length() {
        return end - start;
    }

    public boolean isEmpty() {
        return start == end;
    }

    /** True if the offset lies inside, or just behind the last character (where a cursor may stand). */
    public boolean touches(int offset) {
        return start <= offset && offset <= end;
    }

    public boolean contains(Span other) {
        return start <= other.start && other.end <= end;
    }

    public boolean overlaps(Span other) {
        return start < other.end && other.start < end;
    }

    /** The smallest span that holds both. */
    public Span cover(Span other) {
        return new Span(Math.min(start, other.start), Math.max(end, other.end));
    }

    public String of(CharSequence text) {
        return text.subSequence(start, end).toString();
    }
}
