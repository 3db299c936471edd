namespace HarmonicSweep.Network;

/// <summary>A plant seen in one operating state: answers what is in, at which step, strength, tap and loading.</summary>
public sealed class PlantInState
{
    private readonly Dictionary<(string Element, Type Kind), StateSetting> _settings = [];

    /// <summary>Views <paramref name="plant"/> in <paramref name="state"/>; later settings win over earlier ones.</summary>
    public PlantInState(Plant plant, OperatingState state)
    {
        Plant = plant;
        State = state;
        foreach (StateSetting setting in state.Settings)
        {
            _settings[(setting.Element, setting.GetType())] = setting;
        }
    }

    /// <summary>The plant.</summary>
    public Plant Plant { get; }

    /// <summary>The state.</summary>
    public OperatingState State { get; }

    /// <summary>Whether the element is in service: a coupler closed, a bank with at least one step in.</summary>
    public bool IsIn(PlantElement element)
    {
        bool drawn = element is not Coupler coupler || coupler.Closed;
        bool switched = Find<ServiceSetting>(element)?.In ?? drawn;
        return switched && (element is not CapacitorBank bank || StepsIn(bank) > 0);
    }

    /// <summary>Steps of the bank in service; 0 when it is switched out.</summary>
    public int StepsIn(CapacitorBank bank) => Find<ServiceSetting>(bank) is { In: false }
        ? 0
        : Find<StepsSetting>(bank)?.Steps ?? bank.StepsIn;

    /// <summary>Short-circuit power of the supply, MVA at nominal bus voltage.</summary>
    public double ShortCircuitMva(Supply supply)
    {
        ShortCircuitLevel level = Find<ShortCircuitSetting>(supply)?.Level ?? ShortCircuitLevel.Max;
        return level.Mva ?? (level.Minimum ? supply.ShortCircuitMvaMin : supply.ShortCircuitMvaMax);
    }

    /// <summary>Tap of the transformer, percent.</summary>
    public double TapPercent(Transformer transformer) => Find<TapSetting>(transformer)?.Percent ?? transformer.TapPercent;

    /// <summary>Loading of a load, motor or converter, percent.</summary>
    public double LoadingPercent(ShuntElement element) => Find<LoadingSetting>(element)?.Percent ?? element switch
    {
        Motor motor => motor.LoadingPercent,
        Converter converter => converter.LoadingPercent,
        _ => 100,
    };

    private T? Find<T>(PlantElement element)
        where T : StateSetting => (T?)_settings.GetValueOrDefault((element.Name, typeof(T)));
}
