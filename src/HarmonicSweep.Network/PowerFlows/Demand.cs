using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>Constant power drawn at the fundamental: loads of every model, motors and converters.</summary>
public static class Demand
{
    /// <summary>Power an element draws in a state, MVA three-phase; zero for an element that draws no constant power.</summary>
    public static Complex Of(PlantElement element, PlantInState plant)
    {
        switch (element)
        {
            case LinearLoad load:
                return new Complex(load.PKw, load.QKvar) * (plant.LoadingPercent(load) / 100 / 1000);
            case Motor motor:
                return Lagging(motor.RatedMva * motor.PowerFactor, motor.PowerFactor) * (plant.LoadingPercent(motor) / 100);
            case Converter converter:
                double ratedMw = converter.RatedKw is { } kw
                    ? kw / 1000
                    : Math.Sqrt(3) * plant.Plant.Bus(converter.Bus).NominalKv * converter.RatedA!.Value / 1000 * converter.PowerFactor;
                return Lagging(ratedMw, converter.PowerFactor) * (plant.LoadingPercent(converter) / 100);
            default:
                return Complex.Zero;
        }
    }

    private static Complex Lagging(double activeMw, double powerFactor) =>
        new(activeMw, activeMw * Math.Sqrt(Math.Max(0, 1 - powerFactor * powerFactor)) / powerFactor);
}
