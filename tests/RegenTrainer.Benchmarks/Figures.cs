using System.Globalization;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Loggers;
using BenchmarkDotNet.Reports;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;

namespace RegenTrainer.Benchmarks;

/// <summary>A short run of every figure, printed with its ratio to the baseline of the same run.</summary>
internal static class Figures
{
    private static readonly (string Method, string Meaning, double MostMicroseconds)[] _lines =
    [
        (nameof(StageBenchmark.TankUpdate), "tank mode and operating point after a step of the control", 5),
        (nameof(StageBenchmark.TipOverAlongTravel), "tip-over along the whole travel", 400),
        (nameof(StageBenchmark.CompleteReading), "complete reading", 1000),
        (nameof(StageBenchmark.DialThreeGrades), "Dial page: three grades, 60 points each", 60000),
    ];

    /// <summary>Runs and prints; 1 where a benchmark gave no figure.</summary>
    public static int Run(TextWriter output)
    {
        Job job = Job.Default.WithToolchain(InProcessEmitToolchain.Instance).WithLaunchCount(1)
            .WithWarmupCount(15).WithIterationCount(21).WithIterationTime(Perfolizer.Horology.TimeInterval.FromMilliseconds(100));
        ManualConfig config = ManualConfig.CreateEmpty().AddJob(job).AddLogger(NullLogger.Instance)
            .AddColumnProvider(BenchmarkDotNet.Columns.DefaultColumnProviders.Instance)
            .WithOptions(ConfigOptions.DisableOptimizationsValidator)
            .WithArtifactsPath(Path.Combine(Path.GetTempPath(), "regentrainer-figures"));
        Summary baseline = BenchmarkRunner.Run<BaselineBenchmark>(config), stage = BenchmarkRunner.Run<StageBenchmark>(config);
        double unit = baseline.Reports.Single().ResultStatistics!.Median;
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"baseline: one dependent complex multiply-add {unit:0.00} ns"));
        output.WriteLine("figure                                                        median       at most   x baseline   bytes");
        foreach ((string method, string meaning, double most) in _lines)
        {
            BenchmarkReport? report = stage.Reports.FirstOrDefault(r => r.BenchmarkCase.Descriptor.WorkloadMethod.Name == method);
            if (report?.ResultStatistics is not { } statistics)
            {
                output.WriteLine($"{meaning}: no figure");
                return 1;
            }

            long bytes = report.GcStats.GetBytesAllocatedPerOperation(report.BenchmarkCase) ?? -1;
            Line(meaning, statistics.Median / 1000, most, bytes);
        }

        (double median, double p99, double bytesPerKey) = KeyToFrame.Run();
        Line("key to end of draw at 120x40, median", median, 4000, bytesPerKey);
        Line("key to end of draw at 120x40, 99th percentile", p99, 16000, bytesPerKey);
        (double stepMedian, double stepP99, double bytesPerStep) = PartsStepToFrame.Run();
        Line("step of the turns in Parts to end of draw, median", stepMedian, 8000, bytesPerStep);
        Line("step of the turns in Parts, 99th percentile", stepP99, 32000, bytesPerStep);
        return 0;

        void Line(string meaning, double microseconds, double most, double bytes) => output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"{meaning,-57} {microseconds,9:0.00} us {most,9:0} us {microseconds * 1000 / unit,12:0} {bytes,7:0}"));
    }
}
