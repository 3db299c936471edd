using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <content>The workshop of the program itself.</content>
internal sealed partial record Workshop
{
    /// <summary>The readers, studies and plots of the program.</summary>
    public static Workshop Real { get; } = new()
    {
        ReadCase = static folder => throw new NotSupportedException(),
        NewCase = static folder => throw new NotSupportedException(),
        DrawPlots = static (caseFile, result, folder) => { },
        Check = static (request, progress, cancellation) => CheckStudy.Run(request, progress, cancellation),
        Impedance = static (request, progress, cancellation) => ImpedanceStudy.Run(request, progress, cancellation),
        Distortion = static (request, progress, cancellation) => DistortionStudy.Run(request, progress, cancellation),
        Screen = static (request, progress, cancellation) => ScreenStudy.Run(request, progress, cancellation),
        Main = static (request, progress, cancellation) => MainStudy.Run(request, progress, cancellation),
    };
}
