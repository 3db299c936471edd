namespace HarmonicSweep.Network;

/// <summary>A piece of equipment of the plant. Immutable; keeps where it was read so that any complaint can point at it.</summary>
public abstract record PlantElement
{
    /// <summary>Unique name; buses and elements share one namespace.</summary>
    public required string Name { get; init; }

    /// <summary>File and line it was read from.</summary>
    public required SourceLocation Location { get; init; }

    /// <summary>Names of the buses it ends at, in the order of its table (one or two).</summary>
    public abstract IReadOnlyList<string> Terminals { get; }
}

/// <summary>An element that ends at one bus.</summary>
public abstract record ShuntElement : PlantElement
{
    /// <summary>Bus it stands at.</summary>
    public required string Bus { get; init; }

    /// <inheritdoc/>
    public sealed override IReadOnlyList<string> Terminals => [Bus];
}

/// <summary>An element between two buses.</summary>
public abstract record BranchElement : PlantElement
{
    /// <summary>First end; the high-voltage side of a transformer.</summary>
    public required string EndA { get; init; }

    /// <summary>Second end; the low-voltage side of a transformer.</summary>
    public required string EndB { get; init; }

    /// <inheritdoc/>
    public sealed override IReadOnlyList<string> Terminals => [EndA, EndB];
}

/// <summary>A bus: a place where elements meet.</summary>
/// <param name="Name">Unique name.</param>
/// <param name="NominalKv">Nominal line-to-line voltage, kV, above 0.</param>
/// <param name="Location">File and line it was read from.</param>
/// <param name="Note">Free text; null when blank.</param>
public sealed record Bus(string Name, double NominalKv, SourceLocation Location, string? Note = null);
