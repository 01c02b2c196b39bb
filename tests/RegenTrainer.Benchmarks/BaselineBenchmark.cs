using System.Numerics;
using BenchmarkDotNet.Attributes;

namespace RegenTrainer.Benchmarks;

/// <summary>The unit every figure is a multiple of: a thousand steps of z = z z + c, each waiting for the one before.</summary>
public class BaselineBenchmark
{
    /// <summary>Steps in one call.</summary>
    public const int Steps = 1000;

    private readonly Complex _constant = new(0.3, 0.2);

    [Benchmark(OperationsPerInvoke = Steps)]
    public Complex ComplexMultiplyAdd()
    {
        Complex z = new(0.5, 0.1), c = _constant;
        for (int k = 0; k < Steps; k++)
        {
            z = (z * z) + c;
        }

        return z;
    }
}
