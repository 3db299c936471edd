using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>One element in service as a block of admittances between its buses (1 x 1 a shunt, 2 x 2 a branch).</summary>
/// <param name="Name">Name it is reported under (a no-load branch has its own).</param>
/// <param name="Buses">Buses it ends at.</param>
/// <param name="Y">Siemens per phase; Y V = currents into the element.</param>
/// <param name="TiesToGround">Whether current can leave through it to ground.</param>
internal sealed record TwinPart(string Name, IReadOnlyList<string> Buses, Complex[,] Y, bool TiesToGround)
{
    /// <summary>Everything that stands in Z(h): sources shorted, loads by their model, motors by locked rotor.</summary>
    public static List<TwinPart> Harmonic(PlantInState state, double h, int sequence)
    {
        List<TwinPart> parts = Common(state, h, sequence);
        foreach (PlantElement element in state.Plant.Elements.Where(state.IsIn))
        {
            switch (element)
            {
                case Generator generator:
                    parts.Add(Shunt(generator, TwinShunts.Generator(generator, h)));
                    break;
                case Motor motor:
                    parts.Add(Shunt(motor, TwinShunts.Motor(motor, h)));
                    break;
                case LinearLoad load when TwinShunts.Load(state, load, h) is { } y:
                    parts.Add(Shunt(load, y));
                    break;
            }
        }

        return parts;
    }

    /// <summary>The power-flow network: without generators, loads and motors.</summary>
    public static List<TwinPart> PowerFlow(PlantInState state) => Common(state, 1, 1);

    private static List<TwinPart> Common(PlantInState state, double h, int sequence)
    {
        List<TwinPart> parts = [];
        foreach (PlantElement element in state.Plant.Elements.Where(state.IsIn))
        {
            switch (element)
            {
                case Supply supply:
                    parts.Add(Shunt(supply, 1 / TwinShunts.SupplyImpedance(state, supply, h)));
                    break;
                case CapacitorBank bank:
                    parts.Add(Shunt(bank, TwinShunts.Bank(state, bank, h)));
                    break;
                case Filter filter:
                    parts.Add(Shunt(filter, TwinShunts.Filter(filter, h)));
                    break;
                case Line line:
                    parts.Add(Branch(line, TwinBranches.Line(line, state.Plant.FrequencyHz, h), line.CapacitanceNanofaradPerKm > 0));
                    break;
                case SeriesReactor reactor:
                    parts.Add(Branch(reactor, TwinBranches.Reactor(reactor, h), tiesToGround: false));
                    break;
                case Transformer transformer:
                    parts.Add(Branch(transformer, TwinBranches.Transformer(state, transformer, h, sequence), tiesToGround: false));
                    if (transformer.NoLoadLossKw > 0 || transformer.NoLoadCurrentPercent > 0)
                    {
                        Complex y = TwinBranches.NoLoad(transformer, h);
                        parts.Add(new TwinPart(transformer.Name + " (no load)", [transformer.EndA], new[,] { { y } }, TiesToGround: true));
                    }

                    break;
            }
        }

        return parts;
    }

    private static TwinPart Shunt(ShuntElement element, Complex y) => new(element.Name, [element.Bus], new[,] { { y } }, TiesToGround: true);

    private static TwinPart Branch(BranchElement element, Complex[,] y, bool tiesToGround) =>
        new(element.Name, [element.EndA, element.EndB], y, tiesToGround);
}
