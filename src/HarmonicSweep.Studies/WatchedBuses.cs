using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Buses a command reports when none is asked for.</summary>
public static class WatchedBuses
{
    /// <summary>The buses asked for; else the PCC and every bus with a bank, filter or converter, in table order.</summary>
    public static IReadOnlyList<string> Of(StudyRequest request)
    {
        if (request.Buses.Count > 0)
        {
            return request.Buses;
        }

        var marked = new HashSet<string>(StringComparer.Ordinal);
        if (request.Settings.PccBus is { } pcc)
        {
            marked.Add(pcc);
        }

        foreach (PlantElement element in request.Plant.Elements)
        {
            if (element is CapacitorBank or Filter or Converter)
            {
                marked.Add(element.Terminals[0]);
            }
        }

        string[] buses = [.. request.Plant.Buses.Select(b => b.Name).Where(marked.Contains)];
        return buses.Length > 0 ? buses : [.. request.Plant.Buses.Select(b => b.Name)];
    }
}
