using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Reports.Pictures;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <content>The workshop of the program itself.</content>
internal sealed partial record Workshop
{
    /// <summary>The readers, studies and plots of the program.</summary>
    public static Workshop Real { get; } = new()
    {
        ReadCase = static folder => CaseReader.Read(folder),
        NewCase = static folder => CaseTemplate.Write(folder),
        WarmPlots = static () => PictureBook.Warm(),
        DrawPlots = Draw,
        Check = static (request, progress, cancellation) => CheckStudy.Run(request, progress, cancellation),
        Impedance = static (request, progress, cancellation) => ImpedanceStudy.Run(request, progress, cancellation),
        Distortion = static (request, progress, cancellation) => DistortionStudy.Run(request, progress, cancellation),
        Screen = static (request, progress, cancellation) => ScreenStudy.Run(request, progress, cancellation),
        Main = static (request, progress, cancellation) => MainStudy.Run(request, progress, cancellation),
    };

    private static IReadOnlyList<Finding> Draw(
        CaseFile caseFile, StudyRequest request, StudyResult result, string folder, CancellationToken cancellation)
    {
        IReadOnlyList<Picture> pictures = PictureBook.Plan(caseFile.Plant.Title, result, request.Settings, BusesWithPictures(request, result));
        PictureBook.Write(pictures, folder, request.Threads, cancellation);
        IReadOnlyList<string> missing = PictureBook.MissingCharacters(caseFile.Plant.Title, result);
        return missing.Count == 0 ? [] :
        [
            new Finding(
                Severity.Warning, "HS907", null, $"the PNG plots show a box for {string.Join(' ', missing)}, which their font lacks; the SVG plots have them.",
                "use the SVG plots, or other letters in titles and bus names."),
        ];
    }

    /// <summary>
    /// Every bus asked for (empty = all that have curves); in the main job, where nobody asked, the PCC and the buses of banks
    /// and filters: the other buses stand in the tables, and pictures take most of the time.
    /// </summary>
    private static HashSet<string> BusesWithPictures(StudyRequest request, StudyResult result)
    {
        var buses = new HashSet<string>(StringComparer.Ordinal);
        if (request.Buses.Count > 0 || result.Screen is null)
        {
            return buses;
        }

        buses.UnionWith(request.Plant.Elements.Where(e => e is CapacitorBank or Filter).Select(e => e.Terminals[0]));
        if (request.Settings.PccBus is { } pcc)
        {
            buses.Add(pcc);
        }

        return buses;
    }
}
