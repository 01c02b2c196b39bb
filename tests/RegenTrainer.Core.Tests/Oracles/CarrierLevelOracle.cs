using System.Numerics;
using MathNet.Numerics.LinearAlgebra;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RealVector = MathNet.Numerics.LinearAlgebra.Vector<double>;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// A stage integrated in time at carrier level, by stamps of its own: what the program's modes and envelopes are held against.
/// Losses that depend on frequency are frozen at a reference frequency.
/// </summary>
internal sealed class CarrierLevelOracle
{
    private const int BurstCycles = 8;
    private const int FewestStepsPerCycle = 120;

    private readonly OracleCircuit _plain;
    private readonly OracleBias _plainBias;
    private readonly Lazy<(OracleCircuit Circuit, OracleBias Bias)> _blocking;
    private readonly (string From, string To)? _tuning;

    /// <summary>Stamps a stage and finds its operating point.</summary>
    /// <param name="parts">The stage, tuning and control values written into the parts.</param>
    /// <param name="grade">The device in the regenerating socket; others are typical.</param>
    /// <param name="temperatureCelsius">Temperature of everything in °C.</param>
    /// <param name="lossHz">Frequency at which winding resistances and loss tangents are frozen, in Hz.</param>
    /// <param name="devices">Further devices given by their law.</param>
    internal CarrierLevelOracle(
        IReadOnlyList<Part> parts, Grade grade, double temperatureCelsius, double lossHz, IReadOnlyList<OracleDevice>? devices = null)
    {
        IReadOnlyList<OracleDevice> further = devices ?? [];
        _plain = new OracleCircuit(parts, further, grade, temperatureCelsius, lossHz, OracleLossForm.Plain);
        _plainBias = new OracleBias(_plain);
        _blocking = new Lazy<(OracleCircuit, OracleBias)>(() =>
        {
            var circuit = new OracleCircuit(parts, further, grade, temperatureCelsius, lossHz, OracleLossForm.BlockingDirectCurrent);
            return (circuit, new OracleBias(circuit));
        });
        _tuning = parts.FirstOrDefault(p => p.Role == PartRole.Tuning) is TwoTerminalPart t ? (t.From, t.To) : null;
    }

    /// <summary>Direct voltage of a node at the operating point, in volt.</summary>
    internal double OperatingVolt(string node) => _plain.NodeOf(node) is >= 0 and int n ? _plainBias.Unknowns[n] : 0;

    /// <summary>Direct current of an inductor, source or section (<c>name:index</c>) at the operating point, from its first node, in ampere.</summary>
    internal double OperatingAmpere(string branch) => _plainBias.Unknowns[_plain.BranchOf(branch)];

    /// <summary>The two port voltages of a device, behind its lead resistance, at the operating point, in volt.</summary>
    internal (double Control, double Output) OperatingPorts(string device) =>
        _plainBias.Ports(_plain.Devices.Single(d => d.Device.Name == device));

    /// <summary>
    /// Rings the linearised stage: a burst of current through the tuning capacitor, then free. The later half is fitted.
    /// </summary>
    /// <param name="nodeName">Node whose voltage is read.</param>
    /// <param name="startHz">Frequency of the burst, within a tenth of the mode wanted.</param>
    /// <param name="cycles">Length of the ring in cycles, 100 or more; other modes must have died by half of it.</param>
    /// <param name="stepsPerCycle">Steps in a cycle, 120 or more.</param>
    /// <param name="kickNode">Node the burst is driven into from earth; null for the ends of the tuning capacitor.</param>
    /// <exception cref="InvalidOperationException">The later half is not the ring of a lone mode.</exception>
    internal RingReading SmallSignalRing(string nodeName, double startHz, int cycles, int stepsPerCycle, string? kickNode = null)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(stepsPerCycle, FewestStepsPerCycle);
        ArgumentOutOfRangeException.ThrowIfLessThan(cycles, 100);
        double step = 1 / (startHz * stepsPerCycle);
        var stepper = new TrapezoidStepper(_plain, _plainBias, step, linear: true);
        (int into, int outOf) = KickEnds(_plain, kickNode);
        Func<double, double> burst = Burst(startHz, 1e-3);
        for (int k = 1; k <= BurstCycles * stepsPerCycle; k++)
        {
            SetKick(stepper, into, outOf, burst(k * step));
            stepper.Step();
        }

        Matrix<double> freeStep = stepper.FreeStep();
        (RealVector real, RealVector imaginary) = WindowReading(stepper, freeStep, _plain.NodeOf(nodeName), stepsPerCycle);
        Matrix<double> freeCycle = freeStep.Power(stepsPerCycle);
        RealVector state = stepper.State();
        var late = new List<Complex>();
        for (int cycle = 0; cycle < cycles - DecayFit.WindowCycles; cycle++)
        {
            if (cycle >= cycles / 2)
            {
                late.Add(new Complex(real * state, imaginary * state));
            }

            state = freeCycle * state;
        }

        DecayReading reading = DecayFit.FitAmplitudes([.. late], startHz, stepsPerCycle);
        return reading.WorstDeviation < 0.01
            ? new RingReading(reading.GrowthPerS, reading.Hz, reading.WorstDeviation)
            : throw new InvalidOperationException(
                $"not a lone mode at {nodeName} near {startHz} Hz: the ring departs from one by {reading.WorstDeviation:G3} neper");
    }

    /// <summary>Integrates the stage from its operating point.</summary>
    /// <exception cref="InvalidOperationException">A step does not settle or the stage's equations are singular.</exception>
    internal OracleSamples Run(OracleRun run, string? kickNode = null)
    {
        // A loss tangent must not carry direct current once the bias is free to move.
        (OracleCircuit circuit, OracleBias bias) = run.Linear ? (_plain, _plainBias) : _blocking.Value;
        var stepper = new TrapezoidStepper(circuit, bias, run.StepSeconds, run.Linear);
        (int Unknown, double[] Samples)[] series =
            [.. run.Nodes.Select(circuit.NodeOf).Concat(run.Branches.Select(circuit.BranchOf)).Select(u => (u, new double[run.Steps / run.Every]))];
        (int into, int outOf) = run.KickAmpere is null ? (-1, -1) : KickEnds(circuit, kickNode);
        for (int k = 1; k <= run.Steps; k++)
        {
            double time = k * run.StepSeconds;
            SetKick(stepper, into, outOf, run.KickAmpere?.Invoke(time) ?? 0);
            foreach (int antenna in circuit.Antennas)
            {
                stepper.Sources[antenna] = run.AntennaVolt?.Invoke(time) ?? 0;
            }

            stepper.Step();
            if (k % run.Every == 0)
            {
                foreach ((int unknown, double[] samples) in series)
                {
                    samples[(k / run.Every) - 1] = unknown < 0 ? 0 : bias.Unknowns[unknown] + stepper.Unknowns[unknown];
                }
            }
        }

        int nodes = run.Nodes.Count;
        return new OracleSamples(
            run.Nodes.Select((name, i) => (name, i)).ToDictionary(p => p.name, p => series[p.i].Samples, StringComparer.Ordinal),
            run.Branches.Select((name, i) => (name, i)).ToDictionary(p => p.name, p => series[nodes + p.i].Samples, StringComparer.Ordinal));
    }

    /// <summary>A burst of <see cref="BurstCycles"/> cycles under a raised cosine, so that stray and slow modes are hardly struck.</summary>
    /// <param name="hz">Frequency in Hz.</param>
    /// <param name="peakAmpere">Peak in ampere.</param>
    internal static Func<double, double> Burst(double hz, double peakAmpere) => time =>
        time * hz >= BurstCycles ? 0
        : peakAmpere * 0.5 * (1 - Math.Cos(2 * Math.PI * time * hz / BurstCycles)) * Math.Sin(2 * Math.PI * hz * time);

    private static void SetKick(TrapezoidStepper stepper, int into, int outOf, double ampere)
    {
        if (into >= 0)
        {
            stepper.Sources[into] = ampere;
        }

        if (outOf >= 0)
        {
            stepper.Sources[outOf] = -ampere;
        }
    }

    /// <summary>The row that turns a state into the windowed complex amplitude of a node over the cycles that follow.</summary>
    private static (RealVector Real, RealVector Imaginary) WindowReading(
        TrapezoidStepper stepper, Matrix<double> freeStep, int unknown, int stepsPerCycle)
    {
        Matrix<double> transposed = freeStep.Transpose();
        RealVector row = stepper.ReadingOf(unknown);
        RealVector real = RealVector.Build.Dense(stepper.Size);
        RealVector imaginary = RealVector.Build.Dense(stepper.Size);
        foreach (Complex weight in DecayFit.Weights(stepsPerCycle))
        {
            real += weight.Real * row;
            imaginary += weight.Imaginary * row;
            row = transposed * row;
        }

        return (real, imaginary);
    }

    private (int Into, int OutOf) KickEnds(OracleCircuit circuit, string? kickNode) =>
        kickNode is not null ? (circuit.NodeOf(kickNode), -1)
        : _tuning is { } t ? (circuit.NodeOf(t.From), circuit.NodeOf(t.To))
        : throw new InvalidOperationException("the stage has no tuning capacitor: name the node to kick");
}

/// <summary>A mode as the ring of a stage shows it.</summary>
/// <param name="GrowthPerS">Growth rate in 1/s, negative for a decay.</param>
/// <param name="Hz">Frequency in Hz.</param>
/// <param name="WorstDeviation">Largest departure of the fitted half from a lone mode, in nepers and radians.</param>
internal readonly record struct RingReading(double GrowthPerS, double Hz, double WorstDeviation)
{
    internal void Deconstruct(out double growthPerS, out double hz) => (growthPerS, hz) = (GrowthPerS, Hz);
}
