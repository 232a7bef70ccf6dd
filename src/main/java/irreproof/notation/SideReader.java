package irreproof.notation;

import irreproof.budget.Budget;
import irreproof.notation.parser.StatementParser;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import org.antlr.v4.runtime.BailErrorStrategy;
import org.antlr.v4.runtime.CommonTokenStream;
import org.antlr.v4.runtime.ListTokenSource;
import org.antlr.v4.runtime.RecognitionException;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.atn.ATN;
import org.antlr.v4.runtime.atn.ParserATNSimulator;
import org.antlr.v4.runtime.atn.PredictionContextCache;
import org.antlr.v4.runtime.atn.PredictionMode;
import org.antlr.v4.runtime.dfa.DFA;
import org.antlr.v4.runtime.misc.ParseCancellationException;

/**
 * Parses one side. The fast SLL prediction comes first and full LL only where that fails; both give up at the first
 * error, since a side that is not wholly readable is not read at all. Nesting is counted before the parser runs, because
 * the parser is recursive. The prediction tables belong to one reader and so live as long as one passage.
 */
final class SideReader {
    private static final int DEEPEST = 2 * Lowering.DEEPEST;

    private final DFA[] tables;
    private final PredictionContextCache contexts = new PredictionContextCache();

    SideReader() {
        ATN network = StatementParser._ATN;
        tables = new DFA[network.getNumberOfDecisions()];
        for (int i = 0; i < tables.length; i++) {
            tables[i] = new DFA(network.getDecisionState(i), i);
        }
    }

    /** A side's tree, or what in it could not be read: exactly one of them is null. */
    record Side(Expression tree, Statement.Problem problem) {}

    /**
     * @param lexemes at least one
     * @param otimesIsProduct true if the statement writes its products with {@code \otimes}, so that {@code 2\times 8} in
     *     a sum is a multiplicity
     */
    Side read(List<Lexeme> lexemes, boolean otimesIsProduct, Budget budget) {
        budget.spend(lexemes.size());
        Statement.Problem obstacle = obstacle(lexemes);
        if (obstacle != null) {
            return new Side(null, obstacle);
        }
        StatementParser.SideContext context;
        try {
            context = parse(lexemes, PredictionMode.SLL);
        } catch (ParseCancellationException firstTry) {
            try {
                context = parse(lexemes, PredictionMode.LL);
            } catch (ParseCancellationException failure) {
                return syntaxProblem(lexemes, failure);
            }
        }
        try {
            return new Side(new SumBuilder(otimesIsProduct).side(context), null);
        } catch (UnreadableSide unreadable) {
            return problem(unreadable.getMessage(), unreadable.span());
        }
    }

    /** Something unreadable, or brackets, prefixes or marks that would make the tree too deep. */
    private static Statement.Problem obstacle(List<Lexeme> lexemes) {
        int depth = 0;
        int attached = 0;
        for (Lexeme lexeme : lexemes) {
            if (lexeme.is(StatementParser.UNREADABLE)) {
                return new Statement.Problem("this is not read as a representation", lexeme.span());
            }
            depth += Adjacency.opens(lexeme) ? 1 : 0;
            depth -= Adjacency.closesBracket(lexeme) || lexeme.is(StatementParser.GROUP_CLOSE) ? 1 : 0;
            attached = Adjacency.isMark(lexeme) || lexeme.is(StatementParser.PREFIX) ? attached + 1 : 0;
            if (depth > DEEPEST || attached > DEEPEST) {
                return new Statement.Problem("this is nested too deeply", lexeme.span());
            }
        }
        return null;
    }

    private StatementParser.SideContext parse(List<Lexeme> lexemes, PredictionMode mode) {
        ListTokenSource source = new ListTokenSource(new ArrayList<Token>(lexemes));
        StatementParser parser = new StatementParser(new CommonTokenStream(source));
        parser.setInterpreter(new ParserATNSimulator(parser, StatementParser._ATN, tables, contexts));
        parser.getInterpreter().setPredictionMode(mode);
        parser.setErrorHandler(new BailErrorStrategy());
        parser.removeErrorListeners();
        return parser.side();
    }

    private static Side syntaxProblem(List<Lexeme> lexemes, ParseCancellationException failure) {
        Lexeme last = lexemes.get(lexemes.size() - 1);
        if (failure.getCause() instanceof RecognitionException cause
                && cause.getOffendingToken() instanceof Lexeme place) {
            return problem(
                    "the formula cannot be read from here on", place.span().cover(last.span()));
        }
        return problem("the formula breaks off here", last.span());
    }

    private static Side problem(String message, Span span) {
        return new Side(null, new Statement.Problem(message, span));
    }
}
