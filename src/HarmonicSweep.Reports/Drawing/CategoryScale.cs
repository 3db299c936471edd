namespace HarmonicSweep.Reports.Drawing;

/// <summary>One slot a name: slot i runs from i to i + 1, its tick stands in the middle.</summary>
internal sealed class CategoryScale(IReadOnlyList<string> names)
    : Scale(0, names.Count, [.. names.Select((n, i) => new Tick(i + 0.5, n))])
{
    public override double Fraction(double value) => value / names.Count;
}
