using System.Globalization;

namespace HarmonicSweep.Cli;

/// <summary>A bar on a terminal, shown once a run has taken a second and wiped when it ends. Safe to report to from any thread.</summary>
internal sealed class ProgressBar : IProgress<double>, IDisposable
{
    private const int Width = 30;
    private static readonly TimeSpan Quiet = TimeSpan.FromSeconds(1);
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(100);

    private readonly Lock _lock = new();
    private readonly TextWriter _writer;
    private readonly TimeProvider _clock;
    private readonly string _label;
    private readonly long _start;
    private TimeSpan _next = Quiet;
    private double _share;
    private int _shown;

    /// <summary>Starts the clock.</summary>
    public ProgressBar(TextWriter writer, TimeProvider clock, string label)
    {
        _writer = writer;
        _clock = clock;
        _label = label;
        _start = clock.GetTimestamp();
    }

    /// <summary>Share of the work done, 0 to 1; it never runs backwards.</summary>
    public void Report(double value)
    {
        lock (_lock)
        {
            _share = Math.Clamp(value, _share, 1);
            TimeSpan elapsed = _clock.GetElapsedTime(_start);
            if (elapsed < _next)
            {
                return;
            }

            _next = elapsed + Pause;
            int done = (int)(_share * Width);
            string line = string.Create(
                CultureInfo.InvariantCulture,
                $"{_label} [{new string('=', done)}{new string(' ', Width - done)}] {_share * 100:F0} % {elapsed.TotalSeconds:F0} s");
            _writer.Write("\r" + line.PadRight(_shown));
            _writer.Flush();
            _shown = line.Length;
        }
    }

    /// <summary>Wipes the bar.</summary>
    public void Dispose()
    {
        lock (_lock)
        {
            if (_shown > 0)
            {
                _writer.Write("\r" + new string(' ', _shown) + "\r");
                _writer.Flush();
                _shown = 0;
            }
        }
    }
}
