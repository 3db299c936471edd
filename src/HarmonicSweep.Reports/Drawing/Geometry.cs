namespace HarmonicSweep.Reports.Drawing;

/// <summary>A place on a sheet, in sheet units; y runs downwards.</summary>
internal readonly record struct Spot(double X, double Y);

/// <summary>An upright rectangle on a sheet, in sheet units.</summary>
internal readonly record struct Box(double Left, double Top, double Right, double Bottom)
{
    public double Width => Right - Left;

    public double Height => Bottom - Top;

    public bool Overlaps(Box other) =>
        Left < other.Right && other.Left < Right && Top < other.Bottom && other.Top < Bottom;

    public bool Contains(Box other) =>
        other.Left >= Left && other.Right <= Right && other.Top >= Top && other.Bottom <= Bottom;
}
