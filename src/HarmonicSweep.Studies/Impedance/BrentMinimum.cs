namespace HarmonicSweep.Studies;

/// <summary>
/// Minimum of a function of one variable inside a bracket: parabolic interpolation with golden-section safeguard
/// (Brent 1973, Algorithms for Minimization without Derivatives, chapter 5).
/// </summary>
internal static class BrentMinimum
{
    private const int MostIterations = 100;

    private static readonly double _golden = (3 - Math.Sqrt(5)) / 2;

    /// <summary>Abscissa of a minimum.</summary>
    /// <param name="function">Function.</param>
    /// <param name="left">Lower end of the bracket.</param>
    /// <param name="start">A point inside with a value no larger than at the ends.</param>
    /// <param name="right">Upper end of the bracket.</param>
    /// <param name="relative">Tolerance, relative to the abscissa.</param>
    public static double Find(Func<double, double> function, double left, double start, double right, double relative)
    {
        double best = start;
        double second = start;
        double third = start;
        double atBest = function(best);
        double atSecond = atBest;
        double atThird = atBest;
        double step = 0;
        double previous = 0;
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            double middle = (left + right) / 2;
            double tolerance = relative * Math.Abs(best) + 1e-14;
            if (Math.Abs(best - middle) <= 2 * tolerance - (right - left) / 2)
            {
                break;
            }

            bool golden = true;
            if (Math.Abs(previous) > tolerance)
            {
                // vertex of the parabola through the three best points
                double r = (best - second) * (atBest - atThird);
                double q = (best - third) * (atBest - atSecond);
                double p = (best - third) * q - (best - second) * r;
                q = 2 * (q - r);
                p = q > 0 ? -p : p;
                q = Math.Abs(q);
                if (Math.Abs(p) < Math.Abs(q * previous / 2) && p > q * (left - best) && p < q * (right - best))
                {
                    previous = step;
                    step = p / q;
                    golden = false;
                    double trial = best + step;
                    if (trial - left < 2 * tolerance || right - trial < 2 * tolerance)
                    {
                        step = Math.CopySign(tolerance, middle - best);
                    }
                }
            }

            if (golden)
            {
                previous = best < middle ? right - best : left - best;
                step = _golden * previous;
            }

            double next = best + (Math.Abs(step) >= tolerance ? step : Math.CopySign(tolerance, step));
            double atNext = function(next);
            if (atNext <= atBest)
            {
                (left, right) = next < best ? (left, best) : (best, right);
                (third, atThird, second, atSecond, best, atBest) = (second, atSecond, best, atBest, next, atNext);
            }
            else
            {
                (left, right) = next < best ? (next, right) : (left, next);
                if (atNext <= atSecond || second == best)
                {
                    (third, atThird, second, atSecond) = (second, atSecond, next, atNext);
                }
                else if (atNext <= atThird || third == best || third == second)
                {
                    (third, atThird) = (next, atNext);
                }
            }
        }

        return best;
    }
}
