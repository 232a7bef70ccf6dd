package irreproof.server;

import irreproof.check.Card;
import irreproof.check.FileReport;
import irreproof.check.StatementReport;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.Position;

/** Hover: the innermost card at a place; where it is about the whole statement, with the verdict. */
record Hovering(Document document, FileReport report, ClientProfile client) {

    /** What to show, or null as the protocol has it. */
    Hover at(Position position) {
        Places places = document.places(client.encoding());
        int offset = places.offset(position);
        // A place between two neighbours belongs to the right one.
        return Stream.<Predicate<Span>>of(
                        span -> span.touches(offset) && offset < span.end(), span -> span.touches(offset))
                .map(this::show)
                .flatMap(Optional::stream)
                .findFirst()
                .orElse(null);
    }

    private Optional<Hover> show(Predicate<Span> here) {
        return report.statements().stream()
                .filter(statement -> here.test(statement.statement().span())
                        || statement.cards().stream().map(Card::span).anyMatch(here))
                .findFirst()
                .map(statement -> show(statement, here));
    }

    private Hover show(StatementReport statement, Predicate<Span> here) {
        Span whole = statement.statement().span();
        Card card = statement.cards().stream()
                .filter(candidate -> here.test(candidate.span()))
                .min(Comparator.comparingInt(candidate -> candidate.span().length()))
                .orElse(new Card(whole, "", List.of()));
        List<Card.Row> rows = new ArrayList<>(card.rows());
        if (card.span().contains(whole)) {
            rows.add(new Card.Row(
                    "Verdict", new VerdictLine(statement, document.source().lines()).text()));
        }
        return new Hover(
                new CardText(card.title(), rows).in(client.markdown()),
                document.places(client.encoding()).range(card.span()));
    }
}
