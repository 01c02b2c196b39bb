using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Readings;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// A stage driven through its antenna at carrier level until it has settled. Base resistances stand as parts of their own, so that the
/// voltages at the junctions can be read.
/// </summary>
internal sealed class DrivenStage
{
    private const int StepsPerCycle = 120;

    private readonly CarrierLevelOracle _oracle;
    private readonly Bipolar[] _devices;
    private readonly IDeviceLaw[] _laws;
    private readonly string _output;
    private readonly double _hz;

    public DrivenStage(StageUnderTest stage, double tuningFarad, double controlOhm, double hz)
    {
        (_output, _hz) = (stage.Model.Circuit.OutputNode, hz);
        IReadOnlyList<Part> parts = stage.PartsAt(tuningFarad, controlOhm);
        _devices = [.. parts.OfType<Bipolar>()];
        _laws = [.. _devices.Select(q => q.Model.LawAt(Grade.Typical, 20))];
        _oracle = new CarrierLevelOracle(
            [.. parts.Where(p => p is not Bipolar), .. _devices.Select(q => new Resistor("base of " + q.Name, q.Base, Inner(q), q.Model.BaseOhm(Grade.Typical)))],
            Grade.Typical,
            20,
            hz,
            [.. _devices.Select((q, d) => new OracleDevice(q.Name, Inner(q), q.Collector, q.Emitter, 0, _laws[d]))]);
    }

    /// <summary>The last of many cycles.</summary>
    /// <param name="antennaVolt">Amplitude of the electromotive force in volt.</param>
    /// <param name="cycles">Cycles from rest; the drive rises over the first fifth of them.</param>
    public DrivenCycleTruth Settle(double antennaVolt, int cycles)
    {
        // The trapezoidal rule takes w to (2/h) tan(w h/2): with this step the stage meets the drive exactly at its frequency.
        double step = Math.Tan(Math.PI / StepsPerCycle) / (Math.PI * _hz), driven = 1 / (StepsPerCycle * step);
        double rise = cycles / 5 / driven;
        string[] nodes = [.. _devices.SelectMany(q => new[] { Inner(q), q.Collector, q.Emitter }).Append(_output).Append("tank top").Where(n => n != Part.Earth).Distinct()];
        OracleSamples run = _oracle.Run(new OracleRun(step, cycles * StepsPerCycle)
        {
            AntennaVolt = t => antennaVolt * Math.Sin(2 * Math.PI * driven * t) * (t < rise ? 0.5 * (1 - Math.Cos(Math.PI * t / rise)) : 1),
            Nodes = nodes,
        });
        double[] Last(string node) => node == Part.Earth ? new double[StepsPerCycle] : run.Volt[node][^StepsPerCycle..];
        var least = new Dictionary<string, (double Share, double Volt)>(StringComparer.Ordinal);
        for (int d = 0; d < _devices.Length; d++)
        {
            Bipolar q = _devices[d];
            (double rest1, double rest2) = _oracle.OperatingPorts(q.Name);
            double atRest = _laws[d].Evaluate(rest1, rest2).I2;
            (double[] inner, double[] collector, double[] emitter) = (Last(Inner(q)), Last(q.Collector), Last(q.Emitter));
            least[q.Name] = (
                Enumerable.Range(0, StepsPerCycle).Min(k => _laws[d].Evaluate(inner[k] - emitter[k], collector[k] - emitter[k]).I2 / atRest),
                Enumerable.Range(0, StepsPerCycle).Min(k => Math.Sign(atRest) * (collector[k] - emitter[k])));
        }

        return new DrivenCycleTruth(least, Fundamental(Last(_output)), Fundamental(Last("tank top")));
    }

    private static string Inner(Bipolar q) => "inner base of " + q.Name;

    private static double Fundamental(double[] cycle)
    {
        (double real, double imaginary) = (0, 0);
        for (int k = 0; k < cycle.Length; k++)
        {
            (double sine, double cosine) = Math.SinCos(2 * Math.PI * k / cycle.Length);
            (real, imaginary) = (real + (cycle[k] * cosine), imaginary + (cycle[k] * sine));
        }

        return 2 * Math.Sqrt((real * real) + (imaginary * imaginary)) / cycle.Length;
    }
}

/// <summary>A settled cycle.</summary>
/// <param name="Least">For each device the least collector current as a share of that at rest, and the least collector to emitter voltage.</param>
/// <param name="OutputVolt">Amplitude of the fundamental at the output in volt.</param>
/// <param name="TankVolt">Amplitude of the fundamental across the tank in volt.</param>
internal sealed record DrivenCycleTruth(IReadOnlyDictionary<string, (double Share, double Volt)> Least, double OutputVolt, double TankVolt);
