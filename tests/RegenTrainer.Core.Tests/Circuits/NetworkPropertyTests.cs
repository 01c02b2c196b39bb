using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Oracles;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>Laws every network of resistors, capacitors and inductors obeys, on 200 networks from a fixed seed.</summary>
public sealed class NetworkPropertyTests
{
    private const int Networks = 200;

    [Fact]
    public void Impedances_equal_those_of_an_independent_nodal_analysis()
    {
        ForEach((parts, random, seed) =>
        {
            double hz = random.NextLog(1e4, 1e8);
            Workspace w = At(parts, hz);
            Complex expected = new DenseNodalOracle(parts, hz).TransferImpedance("n1", "n1");
            Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("n1"), -1, new Complex(0, 2 * Math.PI * hz), out Complex actual));
            Assert.True(Complex.Abs(actual - expected) <= 1e-9 * Complex.Abs(expected), $"seed {seed}: {actual} for {expected}");
        });
    }

    [Fact]
    public void Passive_networks_take_power_and_all_their_modes_decay()
    {
        ForEach((parts, random, seed) =>
        {
            double hz = random.NextLog(1e4, 1e8);
            Workspace w = At(parts, hz);
            Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("n1"), -1, new Complex(0, 2 * Math.PI * hz), out Complex z));
            Assert.True(z.Real > 0, $"seed {seed}: {z}");
            IReadOnlyList<SpectralMode>? modes = ModeSpectrum.TryFind(w, 2 * Math.PI * hz);
            Assert.NotNull(modes);
            Assert.All(modes, m => Assert.True(m.S.Real <= 1e-9 * Math.Max(Complex.Abs(m.S), 2 * Math.PI * hz), $"seed {seed}: {m.S}"));
        });
    }

    [Fact]
    public void Source_and_sink_may_change_places()
    {
        ForEach((parts, random, seed) =>
        {
            double hz = random.NextLog(1e4, 1e8), r1 = random.NextLog(10, 1e4), r2 = random.NextLog(10, 1e4);
            string last = parts.SelectMany(p => p.Nodes).Where(n => n != Part.Earth).Max(StringComparer.Ordinal)!;
            Complex there = CurrentRatio(parts, "n1", r1, last, r2, hz), back = CurrentRatio(parts, last, r2, "n1", r1, hz);
            Assert.True(Complex.Abs(there - back) <= 1e-9 * Complex.Abs(there), $"seed {seed}: {there} against {back}");
        });
    }

    [Fact]
    public void Every_mode_is_a_zero_of_an_independent_admittance()
    {
        // At a natural frequency the network sustains a voltage without any current fed in: polishing must end where the
        // eigenvalue library says.
        ForEach((parts, random, seed) =>
        {
            Workspace w = At(parts, 1e6);
            IReadOnlyList<SpectralMode> modes = ModeSpectrum.TryFind(w, 2 * Math.PI * 1e6)!;
            foreach (SpectralMode mode in modes.Where(m => m.S.Imaginary > 0 && m.S.Imaginary > 5 * Math.Abs(m.S.Real)))
            {
                mode.Shape.CopyTo(w.Shape, 0);
                mode.Shape.CopyTo(w.LeftShape, 0);
                ModeResult polished = ModeSolver.Polish(w, mode.S, 0, null);
                Assert.True(polished.Found, $"seed {seed}: {polished.Stop}");
                Assert.True(Complex.Abs(polished.S - mode.S) <= 1e-6 * Complex.Abs(mode.S), $"seed {seed}: {polished.S} for {mode.S}");
            }
        });
    }

    [Fact]
    public void A_floating_node_is_named()
    {
        IReadOnlyList<Part> parts = [new Resistor("r", "a", Part.Earth, 1), new Capacitor("c", "lonely", "lost", 1e-12)];
        InvalidOperationException fault = Assert.Throws<InvalidOperationException>(() => Network.Compile(parts));
        Assert.Contains("lonely", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Kirchhoffs_current_law_holds_at_direct_current()
    {
        ForEach((parts, random, seed) =>
        {
            IReadOnlyList<Part> fed = [.. parts, new Supply("battery", "n1", Part.Earth, random.NextLog(1, 100), random.NextLog(0.1, 1000))];
            Workspace w = At(fed, 1e6);
            w.Values.SetDirect(0, regeneratingRemoved: false);
            OperatingPoint point = OperatingPointSolver.Solve(w, regeneratingRemoved: false, fromVoltages: false);
            Assert.True(point.Found, $"seed {seed}: {point.Stop}");
            Assert.True(point.ResidualAmpere < 1e-9, $"seed {seed}: {point.ResidualAmpere}");
        });
    }

    internal static Workspace At(IReadOnlyList<Part> parts, double lossHz)
    {
        var w = new Workspace(Network.Compile(parts));
        w.Values.SetConditions(new NetworkConditions(lossHz, 20, Grade.Typical, null, null));
        w.Values.SetPencil(0, 0, w.Linear, 1);
        return w;
    }

    private static Complex CurrentRatio(IReadOnlyList<Part> parts, string from, double fromOhm, string to, double toOhm, double hz)
    {
        IReadOnlyList<Part> all =
        [
            .. parts, new Antenna("source", "source", Part.Earth), new Resistor("source resistance", "source", from, fromOhm),
            new Resistor("load", to, Part.Earth, toOhm),
        ];
        Workspace w = At(all, hz);
        Assert.True(ResponseSolver.TryAt(w, w.Network.NodeIndex(to), hz, out Complex volt));
        return volt / toOhm;
    }

    private static void ForEach(Action<IReadOnlyList<Part>, CounterRandom, int> check)
    {
        for (int seed = 1; seed <= Networks; seed++)
        {
            check(RandomNetworks.Draw(seed), new CounterRandom(7_000 + seed), seed);
        }
    }
}
