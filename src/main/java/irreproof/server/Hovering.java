package irreproof.server;

import irreproof.check.Card;
import irreproof.check.FileReport;
import irreproof.text.Span;
import java.util.Comparator;
import java.util.Optional;
import java.util.function.Predicate;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.Position;

/** Hover: the innermost card at a place. */
record Hovering(Document document, FileReport report, ClientProfile client) {

    /** What to show, or null as the protocol has it. */
    Hover at(Position position) {
        Places places = document.places(client.encoding());
        int offset = places.offset(position);
        // A place between two neighbours belongs to the right one; one behind the last character to what ends there.
        return innermost(span -> span.start() <= offset && offset < span.end())
                .or(() -> innermost(span -> span.touches(offset)))
                .map(card -> new Hover(
                        new CardText(card.title(), card.rows()).in(client.markdown()), places.range(card.span())))
                .orElse(null);
    }

    private Optional<Card> innermost(Predicate<Span> here) {
        return report.statements().stream()
                .flatMap(statement -> statement.cards().stream())
                .filter(card -> here.test(card.span()))
                .min(Comparator.comparingInt(card -> card.span().length()));
    }
}
