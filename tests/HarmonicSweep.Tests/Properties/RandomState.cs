using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Draws a state: elements out, couplers thrown, bank steps, supply strength, taps and loadings.</summary>
internal static class RandomState
{
    public static OperatingState Draw(string name, RandomDraw draw, Plant plant)
    {
        List<StateSetting> settings = [];
        foreach (PlantElement element in plant.Elements)
        {
            if (draw.Chance(0.08))
            {
                settings.Add(new ServiceSetting(element.Name, element is Coupler { Closed: false }));
            }

            if (!draw.Chance(0.4))
            {
                continue;
            }

            switch (element)
            {
                case CapacitorBank bank:
                    settings.Add(new StepsSetting(bank.Name, draw.Integer(0, bank.Steps)));
                    break;
                case Supply supply:
                    settings.Add(new ShortCircuitSetting(supply.Name, draw.Chance(0.6)
                        ? ShortCircuitLevel.Min
                        : new ShortCircuitLevel(supply.ShortCircuitMvaMax * draw.Between(0.7, 1.5), Minimum: false)));
                    break;
                case Transformer transformer:
                    settings.Add(new TapSetting(transformer.Name, draw.Pick(-5, -2.5, 0, 2.5, 5)));
                    break;
                case LinearLoad or Motor or Converter:
                    settings.Add(new LoadingSetting(element.Name, draw.Pick(0, 30, 80, 110.0)));
                    break;
            }
        }

        return new OperatingState(name, settings);
    }
}
