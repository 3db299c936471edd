using HarmonicSweep.Cases;
using HarmonicSweep.Cli;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Results;

namespace HarmonicSweep.Tests.Cli;

/// <summary>Runs command lines through the real entry point with writers in memory and a workshop of sample results.</summary>
internal sealed class Hsweep
{
    private RunStudy? _study;
    private CaseReadResult _read = new(SampleResult.Case, SampleResult.Case.Findings);

    /// <summary>Requests the studies were given.</summary>
    public List<(string Study, StudyRequest Request)> Asked { get; } = [];

    /// <summary>Every study returns this.</summary>
    public static Hsweep Returning(StudyResult result) => new() { _study = (_, _, _) => result };

    /// <summary>Every study throws this.</summary>
    public static Hsweep Throwing(Exception exception) => new() { _study = (_, _, _) => throw exception };

    /// <summary>Every study does this.</summary>
    public static Hsweep Doing(RunStudy study) => new() { _study = study };

    /// <summary>The case is refused with these findings.</summary>
    public static Hsweep Refusing(params Finding[] findings) => new() { _read = new CaseReadResult(null, findings) };

    /// <summary>Runs one command line.</summary>
    public Task<Outcome> Run(params string[] args) => Run(CancellationToken.None, args);

    /// <summary>Runs one command line.</summary>
    public async Task<Outcome> Run(CancellationToken cancellation, params string[] args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        int code = await HsweepCommand.InvokeAsync(args, new Terminal(output, error), Workshop(), cancellation);
        return new Outcome(code, output.ToString(), error.ToString());
    }

    private Workshop Workshop() => new()
    {
        ReadCase = _ => _read,
        NewCase = folder => folder == "taken" ? new Finding(Severity.Error, "HS001", null, "taken is not empty.", "choose another.") : null,
        WarmPlots = static () => { },
        DrawPlots = Draw,
        Check = Study("check"),
        Impedance = Study("impedance"),
        Distortion = Study("distortion"),
        Screen = Study("screen"),
        Main = Study("study"),
    };

    private RunStudy Study(string name) => (request, progress, cancellation) =>
    {
        Asked.Add((name, request));
        return _study is null ? SampleResult.Of(name) : _study(request, progress, cancellation);
    };

    private static IReadOnlyList<Finding> Draw(CaseFile caseFile, StudyRequest request, StudyResult result, string folder, CancellationToken cancellation)
    {
        File.WriteAllText(Path.Combine(folder, "sample.svg"), "<svg/>");
        return [];
    }

    /// <summary>What a command line did.</summary>
    internal sealed record Outcome(int Code, string Out, string Error);
}
