/// <summary>Runs inside a started hsweep (DOTNET_STARTUP_HOOKS): at its end it names every assembly it loaded on stderr.</summary>
internal static class StartupHook
{
    /// <summary>Called by the runtime before Main.</summary>
    public static void Initialize() => AppDomain.CurrentDomain.ProcessExit += (_, _) =>
    {
        foreach (System.Reflection.Assembly assembly in AppDomain.CurrentDomain.GetAssemblies())
        {
            Console.Error.WriteLine("loaded " + assembly.GetName().Name);
        }
    };
}
