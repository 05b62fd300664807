using BenchmarkDotNet.Running;
using Convection.Correlations.Benchmarks;

BenchmarkSwitcher.FromAssembly(typeof(RoomBenchmarks).Assembly).Run(args);
