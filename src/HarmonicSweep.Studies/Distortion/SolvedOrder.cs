using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>The state of the network at one order, split by source (one part at the fundamental).</summary>
/// <param name="Order">Order, snapped.</param>
/// <param name="BusKv">Per bus and source: sqrt3 times phase-to-neutral voltage, kV.</param>
/// <param name="Ends">Current into each element at each end, split by source.</param>
internal sealed record SolvedOrder(double Order, IReadOnlyDictionary<string, Complex[]> BusKv, IReadOnlyList<EndCurrent> Ends);

/// <summary>Current into an element at one of its ends.</summary>
/// <param name="Element">Element.</param>
/// <param name="Name">Name under which it is reported.</param>
/// <param name="Bus">Bus of that end.</param>
/// <param name="Ampere">Per source, A rms.</param>
/// <param name="Terms">Sum of the magnitudes of the terms the current is made of, A: the scale of its rounding.</param>
internal sealed record EndCurrent(PlantElement Element, string Name, string Bus, Complex[] Ampere, double Terms);
