namespace HarmonicSweep.Network;

/// <summary>Gives each element its law in a scope, state and sequence; null where it takes no part.</summary>
internal sealed class LawBook(PlantInState plant, CircuitScope scope, Sequence sequence)
{
    private bool ShortCircuit => scope is CircuitScope.ShortCircuit or CircuitScope.SupplyShortCircuit;

    /// <summary>Law of an element between two buses; null for a coupler, which merges its buses.</summary>
    public BranchLaw? BranchLawOf(BranchElement element) => element switch
    {
        Line line => new LineLaw(ShortCircuit ? line with { CapacitanceNanofaradPerKm = 0 } : line, plant.Plant.FrequencyHz),
        SeriesReactor reactor => new SeriesBranch(new SeriesImpedance(
            reactor.ReactanceOhm / reactor.QualityFactor, reactor.ReactanceOhm, reactor.Law)),
        Transformer transformer => new TransformerLaw(transformer, plant.TapPercent(transformer), sequence),
        Coupler => null,
        _ => throw new ArgumentOutOfRangeException(nameof(element), element.GetType().Name, "No branch law for this kind of element."),
    };

    /// <summary>Law of an element to ground, or of the no-load branch of a transformer.</summary>
    public ShuntLaw? ShuntLawOf(PlantElement element) => element switch
    {
        Supply supply => SourceLaw.Of(supply, NominalKv(supply), plant.ShortCircuitMva(supply)),
        Generator generator when scope is CircuitScope.Harmonic or CircuitScope.ShortCircuit => SourceLaw.Of(generator),
        _ when ShortCircuit => null,
        Transformer { HasNoLoadBranch: true } transformer => new NoLoadLaw(transformer),
        CapacitorBank bank => new BankLaw(bank, plant.StepsIn(bank)),
        Filter filter => new FilterLaw(filter),
        _ when scope == CircuitScope.PowerFlow => null,
        LinearLoad load when load.Model != LoadModel.None && plant.LoadingPercent(load) > 0 && (load.PKw, load.QKvar) != (0, 0) =>
            new LoadLaw(load, NominalKv(load), plant.LoadingPercent(load)),
        Motor motor => MotorLaw.Create(motor),
        _ => null,
    };

    private double NominalKv(ShuntElement element) => plant.Plant.Bus(element.Bus).NominalKv;
}
