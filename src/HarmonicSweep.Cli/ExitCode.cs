namespace HarmonicSweep.Cli;

/// <summary>What the exit code of <c>hsweep</c> says.</summary>
public static class ExitCode
{
    /// <summary>Computed, and within limits.</summary>
    public const int Ok = 0;

    /// <summary>Computed, and a limit is exceeded or a bank position must not be dwelt on.</summary>
    public const int LimitExceeded = 1;

    /// <summary>The command line, the case or the output folder is wrong.</summary>
    public const int BadInput = 2;

    /// <summary>The computation failed.</summary>
    public const int ComputationFailed = 3;

    /// <summary>Cancelled from outside.</summary>
    public const int Cancelled = 130;
}
