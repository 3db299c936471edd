using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>A study as a command runs it.</summary>
internal delegate StudyResult RunStudy(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation);

/// <summary>Draws the plots of a result into a folder, each as PNG and SVG.</summary>
/// <returns>What a reader of the plots must know.</returns>
internal delegate IReadOnlyList<Finding> DrawPlots(
    CaseFile caseFile, StudyRequest request, StudyResult result, string folder, CancellationToken cancellation);

/// <summary>What the commands call. Every member is a method of its own, so that help loads none of their libraries.</summary>
internal sealed partial record Workshop
{
    /// <summary>Reads a case folder: the case, or null, and its findings.</summary>
    public required Func<string, CaseReadResult> ReadCase { get; init; }

    /// <summary>Writes the tables of a new case; the finding says why it was refused.</summary>
    public required Func<string, Finding?> NewCase { get; init; }

    /// <summary>Gets the drawing library ready in the background.</summary>
    public required Action WarmPlots { get; init; }

    /// <summary>Draws the plots of a result.</summary>
    public required DrawPlots DrawPlots { get; init; }

    /// <summary>Builds every state and solves its power flow.</summary>
    public required RunStudy Check { get; init; }

    /// <summary>Scans impedances.</summary>
    public required RunStudy Impedance { get; init; }

    /// <summary>Computes distortion and judges it.</summary>
    public required RunStudy Distortion { get; init; }

    /// <summary>Screens bank positions.</summary>
    public required RunStudy Screen { get; init; }

    /// <summary>All of them.</summary>
    public required RunStudy Main { get; init; }
}
