using System.Text;
using HarmonicSweep.Cli;

// plain streams: no lock and no flush per line, UTF-8 whatever the console's own encoding
var utf8 = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false);
await using var output = new StreamWriter(Console.OpenStandardOutput(), utf8, bufferSize: 1 << 16);
await using var error = new StreamWriter(Console.OpenStandardError(), utf8) { AutoFlush = true };
return await HsweepCommand.InvokeAsync(args, Terminal.OfProcess(output, error), Workshop.Real, CancellationToken.None);
