using BenchmarkDotNet.Running;
using RegenTrainer.Benchmarks;

if (args is ["figures"])
{
    return Figures.Run(Console.Out);
}

BenchmarkSwitcher.FromAssembly(typeof(StageBenchmark).Assembly).Run(args);
return 0;
