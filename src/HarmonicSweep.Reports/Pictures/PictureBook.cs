using System.Text;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>Plans the pictures of a study and writes them.</summary>
public static class PictureBook
{
    private const int LongestName = 60;

    /// <summary>The pictures a result has data for, in the order a report shows them.</summary>
    /// <param name="caseTitle">Title of the case.</param>
    /// <param name="result">What was computed.</param>
    /// <param name="settings">PCC and summation rule of the study.</param>
    /// <param name="buses">Buses that get impedance and spectrum pictures of their own; empty = all that have curves.</param>
    public static IReadOnlyList<Picture> Plan(
        string caseTitle, StudyResult result, StudySettings settings, IReadOnlyCollection<string> buses)
    {
        var context = new PictureContext(caseTitle, result, settings, buses);
        IEnumerable<Picture> pictures =
        [
            .. ImpedancePicture.Plan(context),
            .. SpectrumPicture.Plan(context),
            .. DistortionPicture.Plan(context),
            .. PositionMapPicture.Plan(context),
            .. GainPicture.Plan(context),
        ];
        var names = new HashSet<string>(StringComparer.OrdinalIgnoreCase);
        return [.. pictures.Select(p => p.Named(UniqueName(p.FileName, names)))];
    }

    /// <summary>
    /// Loads the fonts and the drawing library on a thread of its own, while others are still reading and computing: the first
    /// picture of a process costs ten times the second.
    /// </summary>
    public static void Warm() => ThreadPool.QueueUserWorkItem(static _ =>
    {
        var sample = new Page("", "", [new Panel(Look.Empty(20, 20, 20, 20), 60), Key.Of([new KeyEntry("warm", Look.Series[1])])]);
        sample.ToPng();
        sample.ToSvg();
    });

    /// <summary>
    /// Characters of the case's names that the embedded font cannot draw, each once: the SVG has them, a PNG shows a box
    /// for each. Worth a remark to the user.
    /// </summary>
    /// <param name="caseTitle">Title of the case.</param>
    /// <param name="result">What was computed.</param>
    public static IReadOnlyList<string> MissingCharacters(string caseTitle, StudyResult result)
    {
        IEnumerable<string> names =
        [
            caseTitle,
            .. result.States.Select(s => s.State),
            .. result.States.SelectMany(s => s.Impedance).Select(c => c.At),
            .. result.States.SelectMany(s => s.Distortion).Select(d => d.Bus),
            .. result.Screen?.Maps.Select(m => m.Bank) ?? [],
        ];
        return [.. EmbeddedFonts.Missing(string.Concat(names.Distinct()))];
    }

    /// <summary>Draws the pictures and writes each as PNG and SVG; an earlier picture of the same name is replaced.</summary>
    /// <param name="pictures">Pictures of one plan.</param>
    /// <param name="folder">Folder; made when it does not exist.</param>
    /// <param name="threads">Pictures drawn at the same time; the bytes do not depend on it.</param>
    /// <param name="cancellation">Stops between pictures; nothing new is left in the folder then.</param>
    /// <returns>Paths written, PNG and SVG of each picture in the order of the plan.</returns>
    /// <exception cref="IOException">The folder or a file in it cannot be written; no half-written picture is left.</exception>
    /// <exception cref="UnauthorizedAccessException">The folder may not be written; likewise.</exception>
    public static IReadOnlyList<string> Write(
        IReadOnlyList<Picture> pictures, string folder, int threads, CancellationToken cancellation = default)
    {
        Directory.CreateDirectory(folder);
        string[] paths = [.. pictures.SelectMany(p => new[] { p.FileName + ".png", p.FileName + ".svg" }).Select(f => Path.Combine(folder, f))];
        try
        {
            var options = new ParallelOptions { MaxDegreeOfParallelism = Math.Max(1, threads), CancellationToken = cancellation };
            // a picture is laid out once and rendered twice, by one thread
            Parallel.For(0, pictures.Count, options, i =>
            {
                File.WriteAllBytes(Unfinished(paths[2 * i]), pictures[i].ToPng());
                File.WriteAllBytes(Unfinished(paths[2 * i + 1]), pictures[i].ToSvg());
            });
            foreach (string path in paths)
            {
                File.Move(Unfinished(path), path, overwrite: true);
            }
        }
        catch (AggregateException e) when (e.Flatten().InnerExceptions is [IOException or UnauthorizedAccessException, ..])
        {
            System.Runtime.ExceptionServices.ExceptionDispatchInfo.Throw(e.Flatten().InnerExceptions[0]);
        }
        finally
        {
            foreach (string path in paths.Select(Unfinished).Where(File.Exists))
            {
                File.Delete(path);
            }
        }

        return paths;
    }

    private static string Unfinished(string path) => path + ".unfinished";

    /// <summary>Lower-case ASCII letters, digits and single hyphens, so that the name suits every file system and address.</summary>
    private static string UniqueName(string wanted, HashSet<string> taken)
    {
        var name = new StringBuilder();
        foreach (char c in wanted)
        {
            if (char.IsAsciiLetterOrDigit(c))
            {
                name.Append(char.ToLowerInvariant(c));
            }
            else if (name.Length > 0 && name[^1] != '-')
            {
                name.Append('-');
            }
        }

        string stem = name.ToString(0, Math.Min(name.Length, LongestName)).Trim('-');
        string unique = stem;
        for (int i = 2; !taken.Add(unique); i++)
        {
            unique = FormattableString.Invariant($"{stem}-{i}");
        }

        return unique;
    }
}
