using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Currents into elements from the voltages at their ends, source by source.</summary>
internal static class BranchCurrents
{
    private static readonly double _ampere = 1000 / Math.Sqrt(3);

    /// <summary>Adds the currents into both ends of a branch; voltages in kV (sqrt3 times phase-to-neutral), currents in A.</summary>
    public static void Add(List<EndCurrent> ends, CircuitBranch branch, double order, Complex[] kvA, Complex[] kvB)
    {
        TwoPort y = branch.Law.Admittance(order);
        var intoA = new Complex[kvA.Length];
        var intoB = new Complex[kvA.Length];
        double termsA = 0;
        double termsB = 0;
        for (int s = 0; s < kvA.Length; s++)
        {
            intoA[s] = (y.AA * kvA[s] + y.AB * kvB[s]) * _ampere;
            intoB[s] = (y.BA * kvA[s] + y.BB * kvB[s]) * _ampere;
            termsA += (Complex.Abs(y.AA * kvA[s]) + Complex.Abs(y.AB * kvB[s])) * _ampere;
            termsB += (Complex.Abs(y.BA * kvA[s]) + Complex.Abs(y.BB * kvB[s])) * _ampere;
        }

        ends.Add(new EndCurrent(branch.Element, branch.Element.Name, branch.Element.EndA, intoA, termsA));
        ends.Add(new EndCurrent(branch.Element, branch.Element.Name, branch.Element.EndB, intoB, termsB));
    }

    /// <summary>The current into a shunt from the voltage over it, less an EMF behind it, source by source.</summary>
    public static EndCurrent Shunt(CircuitShunt shunt, double order, Complex[] kv, Complex[] emfKv)
    {
        Complex y = shunt.Law.Admittance(order);
        var into = new Complex[kv.Length];
        double terms = 0;
        for (int s = 0; s < kv.Length; s++)
        {
            into[s] = y * (kv[s] - emfKv[s]) * _ampere;
            terms += Complex.Abs(y) * (Complex.Abs(kv[s]) + Complex.Abs(emfKv[s])) * _ampere;
        }

        return new EndCurrent(shunt.Element, shunt.ReportedName, shunt.Bus, into, terms);
    }

    /// <summary>A current that is given and not made of voltages.</summary>
    public static EndCurrent Given(ShuntElement element, Complex[] ampere) =>
        new(element, element.Name, element.Bus, ampere, ampere.Sum(Complex.Abs));

    /// <summary>Voltages and currents at the fundamental, one part, from the power flow.</summary>
    public static SolvedOrder Fundamental(PowerFlowSolution powerFlow)
    {
        Circuit circuit = powerFlow.Circuit;
        PlantInState plant = circuit.Plant;
        var ends = new List<EndCurrent>();
        foreach (CircuitBranch branch in circuit.Branches)
        {
            Add(ends, branch, 1, [powerFlow.VoltageKv(branch.Element.EndA)], [powerFlow.VoltageKv(branch.Element.EndB)]);
        }

        foreach (CircuitShunt shunt in circuit.Shunts)
        {
            Complex emf = shunt.Element is Supply supply
                ? PowerFlowSolution.SupplyEmfKv(supply, circuit.NominalKv(shunt.Node))
                : Complex.Zero;
            ends.Add(Shunt(shunt, 1, [powerFlow.VoltageKv(shunt.Bus)], [emf]));
        }

        foreach (PlantElement element in plant.Plant.Elements.Where(plant.IsIn))
        {
            switch (element)
            {
                case Generator generator:
                    Complex delivered = powerFlow.IsLive(generator.Bus)
                        ? Complex.Conjugate(powerFlow.GeneratorMva(generator) / powerFlow.VoltageKv(generator.Bus)) * _ampere
                        : Complex.Zero;
                    ends.Add(Given(generator, [-delivered]));
                    break;
                case LinearLoad or Motor or Converter:
                    var drawer = (ShuntElement)element;
                    ends.Add(Given(drawer, [powerFlow.DrawnAmpere(drawer)]));
                    break;
            }
        }

        return new SolvedOrder(
            1, plant.Plant.Buses.ToDictionary(b => b.Name, b => new[] { powerFlow.VoltageKv(b.Name) }, StringComparer.Ordinal), ends);
    }
}
