using BenchmarkDotNet.Running;

BenchmarkSwitcher.FromAssembly(typeof(HarmonicSweep.Benchmarks.NodalSolve).Assembly).Run(args);
