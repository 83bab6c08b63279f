package org.wellwright.solver.potential;

import java.util.List;
import java.util.Optional;

/** The language of formulas, found through the Lookup; callers use {@link FormulaText}. */
public interface FormulaLanguage {
    /** See {@link FormulaText#parse}. */
    Formula parse(String text);

    /** See {@link FormulaText#fault}. */
    Optional<FormulaFault> fault(String text);

    /** See {@link FormulaText#tokens}. */
    List<FormulaToken> tokens(String text);

    /** Functions, constants and variables. */
    List<FormulaWord> words();
}
