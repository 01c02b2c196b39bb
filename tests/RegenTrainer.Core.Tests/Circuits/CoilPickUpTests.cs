using System.Numerics;
using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>Coils that pick up the field, as the network sees them.</summary>
public sealed class CoilPickUpTests
{
    private const double SpeedOfLight = 299792458;
    private const double FieldRadius = 6;
    private const double FieldOhm = 1e9;

    // Induction: e = 2 pi f B N A with B = E/c, so the effective height is 2 pi N A/lambda (Terman 1943): one square metre at
    // 1 MHz gives 20.9584 mm, and mu times that on a rod.
    [Theory]
    [InlineData(1, 1.0, 1.0, 0.0209584)]
    [InlineData(20, 0.0707, 1.0, 0.0296352)]
    [InlineData(66, 78.5398e-6, 90.0, 0.00977767)]
    public void Effective_height_of_a_coil(int turns, double area, double permeability, double metre) =>
        Assert.Equal(metre, CoilPickUp.OfTurns([turns], area, permeability).EffectiveHeightMetre(1e6)!.Value, 1e-5 * metre);

    /// <summary>
    /// The tank with its pick-up against the same tank in the field of a large loop far outside it, whose mutual inductance with
    /// every turn is computed from the loops [Maxwell 1873]. At the middle of a loop B = mu0 I/(2 R), and E = c B.
    /// </summary>
    [Theory]
    [InlineData(0.4e6)]
    [InlineData(1.0e6)]
    [InlineData(1.3e6)]
    public void A_loop_gives_every_node_what_the_field_of_a_far_loop_gives(double hz)
    {
        Winding winding = Winding.OnForm(0.3, new Wire(0.8e-3), 20, 4e-3, [2, 7], -0.04);
        double area = Math.PI * winding.RadiusMetre * winding.RadiusMetre;
        Windings loop = new("loop", Sections, new Coil(winding)) { PickUp = CoilPickUp.OfTurns([2, 5, 13], area) };
        Workspace own = NetworkPropertyTests.At([loop, .. Around], hz);

        Winding far = new(FieldRadius, 1, 0.01, new Wire(1e-3), [], 0);
        Windings both = new("loop", [.. Sections, ("field", Part.Earth)], new Coil([winding, far]));
        Workspace field = NetworkPropertyTests.At(
            [both, new Antenna("source", "field source", Part.Earth), new Resistor("far", "field source", "field", FieldOhm), .. Around], hz);
        double electric = SpeedOfLight * 1.25663706212e-6 / (FieldOhm * 2 * FieldRadius);
        double height = loop.EffectiveHeightMetre(hz)!.Value;
        foreach (string node in new[] { "low tap", "high tap", "top" })
        {
            Complex expected = Response(field, node, hz);

            // The field leads its electromotive force by a quarter cycle; the middle of a loop of 6 m is even within 0.1 %.
            Complex actual = Response(own, node, hz) * height * electric * Complex.ImaginaryOne;
            Assert.Equal(1.0, Complex.Abs(actual / expected), 2e-3);
            Assert.Equal(0.0, Math.Sin((actual / expected).Phase), 2e-3);
        }
    }

    // Far below resonance nothing flows: every tap shows its share of the turns, the whole winding all of it.
    [Fact]
    public void Every_tap_of_a_rod_shows_its_share_of_the_turns()
    {
        Windings rod = new("rod", Sections, new CoredCoil(55e-9, 66, [3, 18], 0.9, (200, 1e6)))
        {
            PickUp = CoilPickUp.OfTurns([3, 15, 48], 78.5398e-6, 90),
        };
        Workspace w = NetworkPropertyTests.At([rod, new Capacitor("tuning", "top", Part.Earth, 1e-12)], 1e3);
        Assert.Equal(3.0 / 66, Complex.Abs(Response(w, "low tap", 1e3)), 1e-6);
        Assert.Equal(18.0 / 66, Complex.Abs(Response(w, "high tap", 1e3)), 1e-6);
        Assert.Equal(1.0, Complex.Abs(Response(w, "top", 1e3)), 1e-6);
    }

    [Fact]
    public void Shares_fit_the_sections_or_are_refused()
    {
        CoredCoil coil = new(55e-9, 66, [3, 18], 0.9, (200, 1e6));
        Windings part = new("rod", Sections, coil) { PickUp = new CoilPickUp([0.5, 0.5], null) };
        Assert.Null(part.EffectiveHeightMetre(1e6));
        Assert.Contains("2 shares", Assert.Throws<InvalidOperationException>(() => Network.Compile([part])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoilPickUp([1.5], null));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoilPickUp([1], 0));
    }

    private static IReadOnlyList<(string From, string To)> Sections => [(Part.Earth, "low tap"), ("low tap", "high tap"), ("high tap", "top")];

    private static Part[] Around =>
    [
        new Capacitor("tuning", "top", Part.Earth, 100e-12),
        new Resistor("at the tap", "low tap", Part.Earth, 1e3),
        new Capacitor("at the high tap", "high tap", Part.Earth, 30e-12),
    ];

    private static Complex Response(Workspace w, string node, double hz)
    {
        Assert.True(ResponseSolver.TryAt(w, w.Network.NodeIndex(node), hz, out Complex response));
        return response;
    }
}
