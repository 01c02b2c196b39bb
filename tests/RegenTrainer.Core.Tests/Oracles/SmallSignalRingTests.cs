using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// Rings against closed forms: the roots of s^2 + 2 a s + 1/(LC) worked out to 20 digits elsewhere for L = 250 uH and
/// C = 100 pF, with a = R/2L or G/2C.
/// </summary>
public sealed class SmallSignalRingTests
{
    private static readonly Capacitor _tuning = new("c", "top", Part.Earth, 100e-12) { Role = PartRole.Tuning };

    [Theory]
    [InlineData(15.8, -31600.0, 1006571.6778268168, 300)]      // Q 100
    [InlineData(0.15, -300.0, 1006584.2409573334, 6000)]       // Q 10 541
    public void A_series_resistance_damps_as_R_over_2L(double ohm, double growth, double hz, int cycles)
    {
        RingReading ring = Oracle(_tuning, new Inductor("l", "top", Part.Earth, 250e-6, ohm)).SmallSignalRing("top", 1.0e6, cycles, 120);
        AssertNear(growth, ring.GrowthPerS, 1e-6);
        AssertNear(hz, ring.Hz, 1e-9);
    }

    [Theory]
    [InlineData(120)]
    [InlineData(240)]
    [InlineData(977)]
    public void The_step_leaves_no_trace(int stepsPerCycle)
    {
        RingReading ring = Oracle(_tuning, new Inductor("l", "top", Part.Earth, 250e-6, 15.8)).SmallSignalRing("top", 1.0e6, 300, stepsPerCycle);
        AssertNear(-31600.0, ring.GrowthPerS, 1e-6);
        AssertNear(1006571.6778268168, ring.Hz, 1e-9);
    }

    [Fact]
    public void Loss_tangents_are_frozen_at_the_reference_frequency()
    {
        Part[] parts = [_tuning with { Q = 500 }, new Inductor("l", "top", Part.Earth, 250e-6)];
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1.0e6);
        RingReading ring = oracle.SmallSignalRing("top", 1.0e6, 1000, 120);
        AssertNear(-6283.1853071795865, ring.GrowthPerS, 1e-6);   // w_ref/(2 x 500)
        AssertNear(1006583.7453602048, ring.Hz, 1e-9);
    }

    [Fact]
    public void A_feedback_element_makes_the_ring_grow()
    {
        Part[] parts =
        [
            _tuning,
            new Inductor("l", "top", Part.Earth, 250e-6),
            new Feedback("f", "top", Part.Earth, Part.Earth, "top", 1e-6, 0.1),   // -0.1 uS across the tank
        ];
        RingReading ring = Oracle(parts).SmallSignalRing("top", 1.0e6, 2000, 120);
        AssertNear(500.0, ring.GrowthPerS, 1e-6);
        AssertNear(1006584.2389441650, ring.Hz, 1e-9);
    }

    [Theory]
    [InlineData(0.82e6, -6666.6666666666667, 821871.90718788763)]   // both sides alike: L (1 + k)
    [InlineData(1.42e6, -20000.0, 1423521.5280171885)]              // against each other: L (1 - k)
    public void Two_coupled_tanks_ring_at_their_two_frequencies(double startHz, double growth, double hz)
    {
        var coils = new FixedWindings(new[,] { { 250e-6, 125e-6 }, { 125e-6, 250e-6 } }, new[,] { { 5.0, 0.0 }, { 0.0, 5.0 } }, []);
        Part[] parts =
        [
            _tuning,
            new Capacitor("c2", "second", Part.Earth, 100e-12),
            new Windings("coil", [("top", Part.Earth), ("second", Part.Earth)], coils),
        ];
        RingReading ring = Oracle(parts).SmallSignalRing("top", startHz, 400, 120);
        AssertNear(growth, ring.GrowthPerS, 1e-5);
        AssertNear(hz, ring.Hz, 1e-8);
    }

    [Fact]
    public void Sections_in_series_add_their_mutual_inductance_and_self_capacitance()
    {
        // 100 uH and 64 uH at k = 0.9 in series: 100 + 64 + 2 x 72 = 308 uH; 150 pF + 5 pF. The shared loss counts four times.
        var coils = new FixedWindings(
            new[,] { { 100e-6, 72e-6 }, { 72e-6, 64e-6 } }, new[,] { { 0.1, 0.1 }, { 0.1, 0.1 } }, [new WindingSpan(0, 2, 5e-12, 10, 90)]);
        Part[] parts = [_tuning with { Farad = 150e-12 }, new Windings("coil", [("top", "tap"), ("tap", Part.Earth)], coils)];
        RingReading ring = Oracle(parts).SmallSignalRing("tap", 0.73e6, 2000, 120);
        AssertNear(-0.4 / (2 * 308e-6), ring.GrowthPerS, 1e-6);
        AssertNear(728415.0734871525, ring.Hz, 1e-7);
    }

    [Fact]
    public void A_device_counts_with_its_slopes_at_the_operating_point()
    {
        // The exponential law at 1 mA and 25 mV: 40 mS/400 = 100 uS across the tank, and 20 pF.
        Part[] parts =
        [
            _tuning,
            new Inductor("l", "top", "bias", 250e-6),
            new Supply("bias", "bias", Part.Earth, 0.025 * 27.631021115928547, 0),   // ln 1e12
            new Supply("collector", "collector", Part.Earth, 5, 0),
        ];
        OracleDevice device = new("q", "top", "collector", Part.Earth, 0, new ExponentialLaw(1e-15, 0.025, 400, 20e-12));
        RingReading ring = new CarrierLevelOracle(parts, Grade.Typical, 20, 1.0e6, [device]).SmallSignalRing("top", 0.92e6, 100, 120);
        const double damping = 100e-6 / (2 * 120e-12);
        AssertNear(-damping, ring.GrowthPerS, 1e-4);
        AssertNear(Math.Sqrt(1 / (250e-6 * 120e-12) - (damping * damping)) / (2 * Math.PI), ring.Hz, 1e-6);
    }

    [Fact]
    public void A_bead_is_resistance_inductance_and_capacitance_in_parallel()
    {
        Part[] parts = [_tuning with { Farad = 80e-12 }, new Bead("b", "top", Part.Earth, 1e6, 250e-6, 20e-12)];
        RingReading ring = Oracle(parts).SmallSignalRing("top", 1.0e6, 1000, 120);
        AssertNear(-5000.0, ring.GrowthPerS, 1e-6);   // 1/(2 R C)
    }

    [Fact]
    public void Slow_modes_and_stray_modes_do_not_disturb_the_reading()
    {
        Part[] parts =
        [
            _tuning,
            new Inductor("l", "top", "foot", 250e-6, 0.15),
            new Resistor("foot", "foot", Part.Earth, 1000),          // with 10 uF: 10 ms, far slower than the ring
            new Capacitor("bypass", "foot", Part.Earth, 10e-6),
            new Inductor("lead", "top", "stray", 1e-6, 1),            // a stray mode at 159 MHz, far above the sampling theorem's limit
            new Capacitor("stray", "stray", Part.Earth, 1e-12),
        ];
        RingReading ring = Oracle(parts).SmallSignalRing("top", 1.0e6, 6000, 120);
        AssertNear(-300.1964618600333, ring.GrowthPerS, 1e-6);   // root of the tank's admittance, worked out to 30 digits elsewhere
        AssertNear(1001593.616450399, ring.Hz, 1e-9);
    }

    [Fact]
    public void Two_close_modes_are_refused()
    {
        var coils = new FixedWindings(new[,] { { 250e-6, 0.5e-6 }, { 0.5e-6, 250e-6 } }, new[,] { { 1.0, 0.0 }, { 0.0, 1.0 } }, []);
        Part[] parts =
        [
            _tuning,
            new Capacitor("c2", "second", Part.Earth, 100e-12),
            new Windings("coil", [("top", Part.Earth), ("second", Part.Earth)], coils),
        ];
        InvalidOperationException refusal = Assert.Throws<InvalidOperationException>(
            () => Oracle(parts).SmallSignalRing("top", 1.0e6, 1000, 120));
        Assert.Contains("not a lone mode", refusal.Message, StringComparison.Ordinal);
    }

    private static CarrierLevelOracle Oracle(params Part[] parts) => new(parts, Grade.Typical, 20, 1.0e6);

    private static void AssertNear(double expected, double actual, double relative) =>
        Assert.True(Math.Abs(actual - expected) <= relative * Math.Abs(expected), $"expected {expected:R}, found {actual:R}");
}
