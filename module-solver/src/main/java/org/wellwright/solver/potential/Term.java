package org.wellwright.solver.potential;

/**
 * One term of a curve as the user wrote it: a member of a family, a formula or a table, with a {@link TermFrame} around
 * it.
 */
public sealed interface Term permits FamilyTerm, FormulaTerm, TableTerm {
    /** Name, on or off, scale, range, channels. */
    TermFrame frame();

    /** The same shape in another frame. */
    Term withFrame(TermFrame frame);
}
