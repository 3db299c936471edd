using System.Numerics;

namespace HarmonicSweep.Numerics;

/// <summary>
/// Solves A x = b for one matrix after another of the same pattern. Owns its scratch memory: one thread, one solver.
/// </summary>
public interface INodalSolver
{
    /// <summary>Pattern of A.</summary>
    SparsityPattern Pattern { get; }

    /// <summary>Values of A at the positions of the pattern; write them, then call <see cref="Factor"/>.</summary>
    Span<Complex> Values { get; }

    /// <summary>Factors the present values.</summary>
    void Factor();

    /// <summary>Solves for one right-hand side, refined, and returns the backward error of the solution.</summary>
    /// <param name="rightHandSide">b, length Size.</param>
    /// <param name="solution">x, length Size; must not overlap b.</param>
    /// <returns>|b - A x|/(|A||x| + |b|) in infinity norms; at most <see cref="NodalSolver.AcceptedBackwardError"/>.</returns>
    /// <exception cref="SingularMatrixException">A has no usable pivot at the row named.</exception>
    double Solve(ReadOnlySpan<Complex> rightHandSide, Span<Complex> solution);
}

/// <summary>A matrix that cannot be solved, with the row to blame.</summary>
public sealed class SingularMatrixException : ArithmeticException
{
    /// <summary>Creates the exception.</summary>
    /// <param name="row">Row (and column) without a usable pivot.</param>
    public SingularMatrixException(int row)
        : base(System.FormattableString.Invariant($"The matrix is singular at row {row}.")) => Row = row;

    /// <summary>Row (and column) of the matrix without a usable pivot.</summary>
    public int Row { get; }
}
