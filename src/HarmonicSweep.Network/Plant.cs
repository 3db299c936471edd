namespace HarmonicSweep.Network;

/// <summary>What is installed, in nameplate terms. Immutable; a state of operation never copies it.</summary>
public sealed class Plant
{
    private readonly Dictionary<string, Bus> _busByName;
    private readonly Dictionary<string, PlantElement> _elementByName;

    /// <summary>Creates a plant from validated parts.</summary>
    /// <param name="title">Title of the case.</param>
    /// <param name="frequencyHz">Fundamental frequency, hertz, above 0.</param>
    /// <param name="buses">Buses; names unique.</param>
    /// <param name="elements">Elements; names unique, every terminal a bus of the plant.</param>
    /// <exception cref="ArgumentException">A name is repeated or a terminal is no bus.</exception>
    public Plant(string title, double frequencyHz, IEnumerable<Bus> buses, IEnumerable<PlantElement> elements)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(frequencyHz);
        Title = title;
        FrequencyHz = frequencyHz;
        Buses = [.. buses];
        Elements = [.. elements];
        _busByName = Buses.ToDictionary(b => b.Name, StringComparer.Ordinal);
        _elementByName = Elements.ToDictionary(e => e.Name, StringComparer.Ordinal);
        foreach (PlantElement element in Elements)
        {
            if (_busByName.ContainsKey(element.Name))
            {
                throw new ArgumentException($"'{element.Name}' names both a bus and an element.", nameof(elements));
            }

            foreach (string bus in element.Terminals)
            {
                if (!_busByName.ContainsKey(bus))
                {
                    throw new ArgumentException($"'{element.Name}' ends at '{bus}', which is no bus.", nameof(elements));
                }
            }
        }
    }

    /// <summary>Title of the case.</summary>
    public string Title { get; }

    /// <summary>Fundamental frequency f1, hertz.</summary>
    public double FrequencyHz { get; }

    /// <summary>Buses in the order of their table.</summary>
    public IReadOnlyList<Bus> Buses { get; }

    /// <summary>Every element, table by table in the order of the tables.</summary>
    public IReadOnlyList<PlantElement> Elements { get; }

    /// <summary>The bus of that name.</summary>
    /// <exception cref="KeyNotFoundException">No bus has that name.</exception>
    public Bus Bus(string name) => _busByName[name];

    /// <summary>The bus of that name, or null.</summary>
    public Bus? FindBus(string name) => _busByName.GetValueOrDefault(name);

    /// <summary>The element of that name, or null.</summary>
    public PlantElement? FindElement(string name) => _elementByName.GetValueOrDefault(name);

    /// <summary>Elements of one kind, in the order of their table.</summary>
    public IEnumerable<T> Of<T>()
        where T : PlantElement => Elements.OfType<T>();
}
