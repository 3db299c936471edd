using System.Text;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>
/// The sound plant damaged at random (seeded): reading never throws, gives a case or an error and never both, speaks in single
/// lines that end with a remedy, and hands on finite numbers only.
/// </summary>
public class MutationTests(ITestOutputHelper output)
{
    private const int Runs = 1000;

    private static readonly string[] Nasty =
    [
        "", "1e308", "-1e308", "1e-320", "1e-400", "1e400", "-0", "1e5", "NaN", "Infinity", "-Infinity", "\u221E", "\uFF11\uFF12", "0x1F", "1 000", "1,000", "1.000,5", "1;5",
        "\"", "\"\"", "\"\"\"", "#", "# x", "=", "base", "all", "MAIN", "LV", "T1", "six pulse", "in", "steps=1e9", "steps=-1", "sc=1e-320", "tap=NaN", "power:;;", "power:1;0;9e9", "eddy", "bessel",
        "Dyn11", "Zz0", "cigre", "none", "double_tuned", "c_type", "\0", "\r", "\n", "\t", "\u2028", "\u0085", "\uFEFF", "\uD83D\uDD0C", "true", "99999999999999999999", "0.0000000001", "99.999999", "-1",
    ];

    [Fact]
    public void Damaged_plants_are_refused_in_words_or_read_whole()
    {
        const int Seed = 20_261_201;
        output.WriteLine($"seed {Seed}");
        var random = new Random(Seed);
        using var folder = new TempFolder();
        for (int run = 0; run < Runs; run++)
        {
            PlantText plant = PlantText.Good;
            string[] files = [.. plant.Files];
            var damaged = new Dictionary<string, byte[]>(StringComparer.Ordinal);
            for (int i = random.Next(1, 4); i > 0; i--)
            {
                string file = files[random.Next(files.Length)];
                damaged[file] = Damage(damaged.TryGetValue(file, out byte[]? earlier) ? earlier : Encoding.UTF8.GetBytes(plant[file]), random, plant);
            }

            damaged.Aggregate(plant, (p, f) => p.With(f.Key, f.Value)).WriteTo(folder.Path);
            try
            {
                Judge(CaseReader.Read(folder.Path));
            }
            catch (Exception exception)
            {
                Assert.Fail($"run {run}: {exception}\n{string.Join("\n", damaged.Select(f => f.Key + ":\n" + Encoding.UTF8.GetString(f.Value)))}");
            }
        }
    }

    private static byte[] Damage(byte[] bytes, Random random, PlantText plant)
    {
        if (random.Next(3) == 0)
        {
            return DamageBytes([.. bytes], random);
        }

        List<string> lines = [.. Encoding.UTF8.GetString(bytes).Split('\n')];
        int line = random.Next(lines.Count);
        string[] cells = lines[line].Split(',');
        int cell = random.Next(cells.Length);
        switch (random.Next(8))
        {
            case 0:
                lines.RemoveAt(line);
                break;
            case 1:
                lines.Insert(random.Next(lines.Count), lines[line]);
                break;
            case 2:
                lines[line] = string.Join(',', cells.Where((_, i) => i != cell));
                break;
            case 3:
                lines[line] = string.Join(',', [.. cells, Nasty[random.Next(Nasty.Length)]]);
                break;
            case 4:
                string[] all = [.. plant.Files];
                return Encoding.UTF8.GetBytes(plant[all[random.Next(all.Length)]]);
            default:
                cells[cell] = Nasty[random.Next(Nasty.Length)];
                lines[line] = string.Join(',', cells);
                break;
        }

        return Encoding.UTF8.GetBytes(string.Join('\n', lines));
    }

    private static byte[] DamageBytes(byte[] bytes, Random random)
    {
        switch (random.Next(4))
        {
            case 0:
                return bytes[..random.Next(bytes.Length + 1)];
            case 1:
                random.NextBytes(bytes);
                return bytes;
            default:
                for (int i = random.Next(1, 5); i > 0 && bytes.Length > 0; i--)
                {
                    bytes[random.Next(bytes.Length)] = (byte)random.Next(256);
                }

                return bytes;
        }
    }

    private static void Judge(CaseReadResult result)
    {
        Assert.Equal(result.Case is null, result.Findings.Any(f => f.Severity == Severity.Error));
        foreach (Finding finding in result.Findings)
        {
            string line = finding.ToString();
            Assert.DoesNotContain(line, c => char.IsControl(c) || c is '\u2028' or '\u2029');
            Assert.True(line.Length < 1500, line);
            Assert.Matches(@"^HS\d{3}$", finding.Id);
            Assert.NotNull(finding.Location);
            Assert.EndsWith(".", finding.Message, StringComparison.Ordinal);
            Assert.EndsWith(".", finding.Remedy, StringComparison.Ordinal);
            Assert.DoesNotContain("Exception", line, StringComparison.Ordinal);
            Assert.DoesNotContain("token", line, StringComparison.Ordinal);
        }

        foreach (PlantElement element in result.Case?.Plant.Elements ?? [])
        {
            string text = (element with { Name = "" }).ToString();
            Assert.False(text.Contains("NaN", StringComparison.Ordinal) || text.Contains("Infinity", StringComparison.Ordinal), text);
        }
    }
}
