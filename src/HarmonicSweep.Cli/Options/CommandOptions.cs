using System.CommandLine;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>How results reach stdout.</summary>
internal enum OutputFormat
{
    /// <summary>Tables for a person.</summary>
    Table,

    /// <summary>CSV tables.</summary>
    Csv,

    /// <summary>One JSON document.</summary>
    Json,
}

/// <summary>The options of all commands. One object serves every command that takes it, so it means the same everywhere.</summary>
internal sealed class CommandOptions
{
    public Argument<string> Case { get; } = new("CASE") { Description = "Case folder: CSV tables and case.toml." };

    public Argument<string> NewFolder { get; } = new("FOLDER") { Description = "Folder to create; it must be missing or empty." };

    public Option<string[]> States { get; } = new("--state")
    {
        HelpName = "name",
        Description = "State to run; repeat for several, all = base and every state. Default: base (study: all).",
    };

    public Option<string[]> Buses { get; } = new("--bus")
    {
        HelpName = "name",
        Description = "Bus to report; repeat for several. Default: the PCC and every bus with a bank, filter or converter (distortion, screen: all).",
    };

    public Option<string?> InjectedAt { get; } = new("--injected-at")
    {
        HelpName = "bus",
        Description = "Inject the current at this bus: transfer impedances instead of driving points.",
    };

    public Option<double[]?> Orders { get; } = OptionValues.Orders(
        "--orders", "Orders to solve, separated by commas, for example 5,7,11.3. Default: the scan range (impedance), every injected order (distortion).");

    public Option<double?> FromHz { get; } = OptionValues.Number(
        "--from-hz", "Hz", "First frequency of the scan. Default: as in case.toml.", x => x > 0, "a frequency above 0 Hz");

    public Option<double?> ToHz { get; } = OptionValues.Number(
        "--to-hz", "Hz", "Last frequency of the scan. Default: as in case.toml.", x => x > 0, "a frequency above 0 Hz");

    public Option<double?> StepHz { get; } = OptionValues.Number(
        "--step-hz", "Hz", "Spacing of listed points; resonances do not depend on it. Default: as in case.toml.", x => x > 0, "a spacing above 0 Hz");

    public Option<Sequence?> Sequence { get; } = OptionValues.Word<Sequence>(
        "--sequence", "Sequence network to scan. Default: positive.",
        (Network.Sequence.Positive.Word(), Network.Sequence.Positive), (Network.Sequence.Negative.Word(), Network.Sequence.Negative));

    public Option<SummationRule?> Rule { get; } = OptionValues.Word<SummationRule>(
        "--rule", "How the contributions of several sources add. Default: as in case.toml.",
        [.. ResultWords.Rules.Select(r => (r.Word(), r))]);

    public Option<bool> Combinations { get; } = new("--combinations")
    {
        Description = "Move all banks together instead of one at a time.",
    };

    public Option<double?> Near { get; } = OptionValues.Number(
        "--near", "orders", "A resonance this close to an injected order is near it. Default: 0.3.", x => x > 0, "a distance above 0 orders");

    public Option<string?> Out { get; } = new("--out")
    {
        HelpName = "DIR",
        Description = "Write CSV tables, result.json, summary.txt and plots to this folder; stdout gets a short summary.",
    };

    public Option<OutputFormat?> Format { get; } = OptionValues.Word<OutputFormat>(
        "--format", "What stdout gets. Default: table.",
        ("table", OutputFormat.Table), ("csv", OutputFormat.Csv), ("json", OutputFormat.Json));

    public Option<int?> Threads { get; } = OptionValues.Count(
        "--threads", "Threads; results do not depend on it. Default: one a processor.");
}
