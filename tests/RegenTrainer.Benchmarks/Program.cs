using BenchmarkDotNet.Running;
using RegenTrainer.Benchmarks;

if (args is ["figures"])
{
    return Figures.Run(Console.Out);
}

if (args is ["hands", var count] && int.TryParse(count, System.Globalization.CultureInfo.InvariantCulture, out int events) && events > 0)
{
    return HandsRun.Run(events, Console.Out);
}

BenchmarkSwitcher.FromAssembly(typeof(StageBenchmark).Assembly).Run(args);
return 0;
