namespace HarmonicSweep.Cli;

/// <summary>A result for a person: what matters first, then the tables, then what to keep in mind.</summary>
internal static class TextReport
{
    /// <summary>Writes every section the result fills.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        Headline.Write(writer, view);
        LimitTables.Write(writer, view);
        BankTables.Write(writer, view);
        DistortionTables.Write(writer, view);
        ImpedanceTables.Write(writer, view);
        OperationTables.Write(writer, view);
        TrustTables.Write(writer, view);
    }
}
