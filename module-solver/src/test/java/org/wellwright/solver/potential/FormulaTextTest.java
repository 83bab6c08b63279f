package org.wellwright.solver.potential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.InvalidModelException;

class FormulaTextTest {
    private static final ChannelFacts CHANNEL = ChannelFacts.ofOrbital(2);

    private static double at3(String text) {
        return FormulaText.parse(text)
                .bind(Map.of("a", 5.0, "b[1]", 7.0, "b[2]", 11.0), CHANNEL)
                .value(3);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-r^2            | -9",
                "(-r)^2          | 9",
                "2^3^2           | 512",
                "2^-1            | 0.5",
                "2^-r^2*512      | 1",
                "-2^2            | -4",
                "--r             | 3",
                "+r-+-r          | 6",
                "2-r-1           | -2",
                "12/r/2          | 2",
                "12/r*2          | 8",
                "2*-r            | -6",
                "1+2*r^2         | 19",
                "(1+2)*r^2       | 27",
                "1e-3*r          | 0.003",
                "1E3*r           | 3000",
                ".5*r            | 1.5",
                "2.*r            | 6",
                "5^2*1e+2        | 2500",
                "l*(l+1)/r^2     | 0.6666666666666666",
                "a*r             | 15",
                "b[1]+b[1+1]     | 18",
                "sum(i,1,2,b[i]*r^i) | 120",
                "sum(i,1,3,sum(j,1,i,j)) | 10",
                "sum(i,2,1,r)    | 0",
                "x = r^2; x+1    | 10",
                "min(r,1,2)      | 1",
                "max(r,1,7)      | 7",
                "abs(1-r)        | 2",
                "step(r-2)+heaviside(2-r) | 1",
                "ln(exp(r))+log(exp(r))   | 6",
                "sqrt(r^4)       | 9",
                "cos(pi*r)       | -1",
                "erf(r)+erfc(r)  | 1",
                "expm1(ln(r))    | 2",
                "log1p(r-1)      | 1.0986122886681098",
                "4·r             | 12",
                "4−r             | 1",
            })
    void followsThePrecedenceOfOrdinaryMathematics(String text, double expected) {
        assertThat(at3(text)).isCloseTo(expected, within(1e-14 * Math.max(1, Math.abs(expected))));
    }

    @Test
    void linesNameIntermediateResults() {
        assertThat(at3("x = exp(-r/a)\ny = x/\n  (1+x)\n\n y*(1+x)/x\n")).isCloseTo(1, within(1e-15));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "`` | column 1: the formula is empty; write V as a function of r",
                "r+ | column 3: the formula ends where a number, a name or '(' must follow; complete it",
                "1+*2 | column 3: a number, a name or '(' is missing before '*'",
                "r**2 | column 2: '**' is not an operator; write ^ for a power",
                "2r | column 2: an operator is missing before 'r'; write * for a product",
                "2(r) | column 2: an operator is missing before '('; write * for a product",
                "r(2) | column 2: an operator is missing between 'r' and '('; write * for a product",
                "(r+1 | column 5: the '(' of column 1 is not closed; add ')'",
                "b[1 | column 4: the '[' of column 2 is not closed; add ']'",
                "r) | column 2: ')' does not belong here; remove it, or close what is open",
                "3$ | column 2: the character '$' means nothing in a formula; remove it",
                "sin r | column 1: 'sin' is a function and needs its argument in parentheses; write sin(...)",
                "exp(1,2) | column 1: exp takes one argument, got 2",
                "exp() | column 1: exp takes one argument, got 0",
                "min(r) | column 1: min takes two or more arguments, got 1",
                "1e400 | column 1: the number 1e400 is too large; use another unit",
                "r+1e-400 | column 3: the number 1e-400 is too small; use another unit",
                "1e99999999999 | column 1: the exponent of 1e99999999999 is too large; use another unit",
                "b[r] | column 3: the index of 'b' must be a whole number from 0 to 999",
                "b[-1] | column 3: the index of 'b' must be a whole number from 0 to 999",
                "b[0.5] | column 3: the index of 'b' must be a whole number from 0 to 999",
                "sum(i,0,a,r) | column 9: the limits of a sum must be whole numbers up to 999",
                "sum(i,0,2000,r) | column 9: the limits of a sum must be whole numbers up to 999",
                "sum(r,0,2,r) | column 5: the first argument of sum must be a name that has no meaning yet; write sum(i, 0, 7, ...)",
                "sum(i,0,2) | column 10: sum takes four arguments: index, first, last, term; write sum(i, 0, 7, ...)",
                "sum | column 1: 'sum' needs its arguments in parentheses; write sum(i, 0, 7, ...)",
                "r=2; r | column 1: 'r' has a meaning of its own and cannot name a line; choose another name",
                "exp=2; r | column 1: 'exp' has a meaning of its own and cannot name a line; choose another name",
                "a=b; b=2; r | column 6: 'b' is used before this line names it; choose another name, or move the line up",
                "a=2; a=3; r | column 6: 'a' is used before this line names it; choose another name, or move the line up",
                "a=2; | column 5: the last line must be an expression; write V as a function of r",
                "a+b=2 | column 4: '=' may only follow the name of a line; write name = expression on a line of its own",
                "r;r | column 3: an operator is missing before 'r'; write * for a product",
            })
    void faultsAreOneLineWithTheColumn(String text, String sentence) {
        assertThatThrownBy(() -> FormulaText.parse(text))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage(sentence);
        assertThat(FormulaText.fault(text))
                .hasValueSatisfying(
                        fault -> assertThat(fault.problem().sentence()).isEqualTo(sentence));
    }

    @Test
    void unknownFunctionsListTheKnown() {
        assertThatThrownBy(() -> FormulaText.parse("1+foo(r)"))
                .hasMessageStartingWith("column 3: the function 'foo' is not known; use one of abs, acos, asin,")
                .hasMessageContaining("tanh");
    }

    @Test
    void parametersWithoutValueListThoseWithOne() {
        Formula formula = FormulaText.parse("a*r+c");
        assertThat(formula.names()).containsExactly("a", "c");
        assertThatThrownBy(() -> formula.bind(Map.of("a", 1.0, "b", 2.0), CHANNEL))
                .isInstanceOf(InvalidModelException.class)
                .hasMessage("column 5: the parameter 'c' has no value; give it one; those with a value are a, b");
        assertThatThrownBy(() -> formula.bind(new double[] {1, Double.NaN}, CHANNEL))
                .hasMessage("column 5: the parameter 'c' must be finite, got NaN; change its value");
    }

    @Test
    void textsOfSeveralLinesSayTheLine() {
        assertThatThrownBy(() -> FormulaText.parse("x = r^2\n-1/y(x"))
                .hasMessageStartingWith("line 2, column 4: the function 'y'");
    }

    @Test
    void nestingAndLengthAreBounded() {
        assertThatThrownBy(() -> FormulaText.parse("(".repeat(100_000) + "r" + ")".repeat(100_000)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageStartingWith("column 10001: the formula has 200001 characters, the limit is 10000");
        assertThatThrownBy(() -> FormulaText.parse("(".repeat(4_000) + "r"))
                .hasMessageStartingWith("column 201: the formula is nested deeper than 200");
        assertThatThrownBy(() -> FormulaText.parse("-".repeat(4_000) + "r"))
                .hasMessageStartingWith("column 201: the formula is nested deeper than 200");
        assertThatThrownBy(() -> FormulaText.parse("2^".repeat(4_000) + "r"))
                .hasMessageContaining("nested deeper than 200");
        assertThat(at3("(".repeat(200) + "r" + ")".repeat(200))).isEqualTo(3);
        assertThat(at3("r" + "+r".repeat(4_999))).isEqualTo(15_000);
    }

    @Test
    void sumsThatUnrollTooFarAreRefused() {
        assertThatThrownBy(() -> FormulaText.parse("sum(i,0,999,sum(j,0,999,sin(i*r)*j^r))"))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("more than 20000 operations");
    }

    @Test
    void channelDependenceIsKnown() {
        assertThat(FormulaText.parse("l/r").dependsOnChannel()).isTrue();
        assertThat(FormulaText.parse("a/r").dependsOnChannel()).isFalse();
        TermEvaluator s = FormulaText.parse("a/r").bind(Map.of("a", 1.0), ChannelFacts.ofOrbital(0));
        TermEvaluator d = FormulaText.parse(" q / r ").bind(Map.of("q", 1.0), ChannelFacts.ofOrbital(2));
        assertThat(s.canonical())
                .as("names, blanks and an unused l do not count")
                .isEqualTo(d.canonical());
    }

    @Test
    void tokensNameEveryPiece() {
        List<FormulaToken> tokens = FormulaText.tokens("x=exp(-r)\nb[0]*x+2e1$");
        assertThat(tokens)
                .extracting(FormulaToken::kind)
                .containsExactly(
                        FormulaToken.Kind.LOCAL,
                        FormulaToken.Kind.OPERATOR,
                        FormulaToken.Kind.FUNCTION,
                        FormulaToken.Kind.PUNCTUATION,
                        FormulaToken.Kind.OPERATOR,
                        FormulaToken.Kind.RADIUS,
                        FormulaToken.Kind.PUNCTUATION,
                        FormulaToken.Kind.PUNCTUATION,
                        FormulaToken.Kind.PARAMETER,
                        FormulaToken.Kind.PUNCTUATION,
                        FormulaToken.Kind.NUMBER,
                        FormulaToken.Kind.PUNCTUATION,
                        FormulaToken.Kind.OPERATOR,
                        FormulaToken.Kind.LOCAL,
                        FormulaToken.Kind.OPERATOR,
                        FormulaToken.Kind.NUMBER,
                        FormulaToken.Kind.FAULTY);
    }

    @Test
    void completionsBeginLikeTheWordBeforeTheCaret() {
        assertThat(FormulaText.completions("1+ex", 4, List.of("expo", "depth")))
                .extracting(FormulaWord::text)
                .containsExactly("exp(", "expo", "expm1(");
        assertThat(FormulaText.completions("12", 2, List.of("a"))).isEmpty();
        assertThat(FormulaText.completions("", 0, List.of("a")))
                .extracting(FormulaWord::text)
                .contains("a", "r", "sqrt(");
    }
}
