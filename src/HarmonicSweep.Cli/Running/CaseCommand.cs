using System.CommandLine;

namespace HarmonicSweep.Cli;

/// <summary>A command that computes something from a case.</summary>
/// <param name="Name">Word on the command line.</param>
/// <param name="Summary">One line of help.</param>
/// <param name="Example">An example of its use.</param>
/// <param name="Run">Its study.</param>
/// <param name="EveryStateByDefault">Whether it runs every state when none is asked for.</param>
/// <param name="Options">Options that mean something to it, beside the case.</param>
internal sealed record CaseCommand(
    string Name, string Summary, string Example, RunStudy Run, bool EveryStateByDefault, IReadOnlyList<Option> Options)
{
    /// <summary>Every such command, in the order of help.</summary>
    public static IReadOnlyList<CaseCommand> All(Workshop workshop, CommandOptions o) =>
    [
        new(
            "check", "Read the case, build the states and solve their power flow.",
            "hsweep check cases/demo-plant --state all", workshop.Check, false,
            [o.States, o.Out, o.Format, o.Threads]),
        new(
            "impedance", "Scan harmonic impedances and list their resonances.",
            "hsweep impedance cases/demo-plant --bus MV-BUS --orders 5,7,11.3", workshop.Impedance, false,
            [o.States, o.Buses, o.InjectedAt, o.Orders, o.FromHz, o.ToHz, o.StepHz, o.Sequence, o.Out, o.Format, o.Threads]),
        new(
            "distortion", "Compute harmonic voltages, currents and THD, and judge them by the limits.",
            "hsweep distortion cases/demo-plant --state all --rule iec", workshop.Distortion, false,
            [o.States, o.Buses, o.Orders, o.Rule, o.Out, o.Format, o.Threads]),
        new(
            "screen", "Run every position of every bank at every supply strength; name those not to dwell on.",
            "hsweep screen cases/demo-plant --combinations", workshop.Screen, false,
            [o.States, o.Buses, o.FromHz, o.ToHz, o.StepHz, o.Rule, o.Combinations, o.Near, o.Out, o.Format, o.Threads]),
        new(
            "study", "The main job: check, impedance, distortion and screen in every way the plant can be switched.",
            "hsweep study cases/demo-plant --out results", workshop.Main, true,
            [
                o.States, o.Buses, o.InjectedAt, o.Orders, o.FromHz, o.ToHz, o.StepHz, o.Sequence, o.Rule, o.Combinations, o.Near,
                o.Out, o.Format, o.Threads,
            ]),
    ];
}
