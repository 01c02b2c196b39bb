using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Readings;

namespace RegenTrainer.Core.Tests.Selectivity;

/// <summary>Bandwidth, sidebands and the speech index against closed forms and handbook figures.</summary>
public sealed class SelectivityTests
{
    [Fact]
    public void A_lone_tank_has_bandwidth_f_over_q()
    {
        foreach (double q in new[] { 50.0, 300, 5000 })
        {
            Reading reading = LoneTank(q).Read(1e6, 0);
            Assert.Equal(reading.TankHz!.Value / reading.EffectiveQ!.Value, reading.BandwidthHz!.Value, 1e6 / q / q * 2);
            Assert.Equal(1e6 / q, reading.BandwidthHz.Value, 1e6 / q * 1e-3);
        }
    }

    // At critical coupling B = sqrt2 f0/Q: Aiken, Proc. IRE 25, 230 (1937). What a lone tank of the same mode would have is another figure.
    [Fact]
    public void Two_critically_coupled_tanks_have_bandwidth_root_2_f_over_q()
    {
        const double q = 200, farad = 100e-12;
        double henry = 1 / (Math.Pow(2 * Math.PI * 1e6, 2) * farad);
        IReadOnlyList<Part> parts =
        [
            new Antenna("source", "source", Part.Earth), new Resistor("feed", "source", "first", 1e9),
            new Windings("coils", [("first", Part.Earth), ("second", Part.Earth)], new CoupledSections(
                [new InductiveSection(henry, q), new InductiveSection(henry, q)], [new SectionCoupling(0, 1, 1 / q)])),
            new Capacitor("tuning", "first", Part.Earth, farad) { Role = PartRole.Tuning },
            new Capacitor("fixed", "second", Part.Earth, farad),
        ];
        var stage = new StageUnderTest(FreeFamily.Design(parts, "second", new VariableCapacitor(10e-12, 500e-12)));
        Reading reading = stage.Read(new Setting(1e6, 0) { DialMode = DialMode.Locked, LockedFarad = farad, StationHz = 1e6 });
        Assert.Equal(Math.Sqrt(2) * 1e6 / q, reading.BandwidthHz!.Value, Math.Sqrt(2) * 1e6 / q * 0.005);
        double asALoneTank = reading.TankHz!.Value / reading.EffectiveQ!.Value;
        Assert.True(Math.Abs(asALoneTank - reading.BandwidthHz.Value) > 0.2 * asALoneTank);
    }

    // 1/sqrt(1 + Q^2 (f/f0 - f0/f)^2) 3 kHz off a tank of Q 1000 at 1 MHz: the sidebands of a 3 kHz tone fall on the tank and
    // 6 kHz from it. 20 log10 sqrt(1 + 12^2) = 21.6 dB.
    [Fact]
    public void A_station_beside_the_tank_has_unlike_sidebands()
    {
        StageUnderTest stage = LoneTank(1000);
        Reading reading = stage.Read(new Setting(1e6, 0) { StationHz = 1.003e6 }, 3000);
        Sideband sideband = reading.Sidebands[0];
        Assert.Equal(21.6, sideband.LowerDb - sideband.UpperDb, 0.3);
        IReadOnlyList<ResponsePoint> response = StageReader.Response(
            stage.Workspace, new Setting(1e6, 0) { StationHz = 1.003e6 }, [1.000e6, 1.003e6, 1.006e6]);
        Assert.Equal(response[2].GainDb - response[1].GainDb, sideband.UpperDb, 1e-6);
        Assert.Equal(response[0].GainDb - response[1].GainDb, sideband.LowerDb, 1e-6);
        Assert.Contains(reading.Cautions, c => c.Code == "sideband-stands-out");
    }

    // A lone tank of Q 1240 at 999 kHz with all bands has a speech index of 0.592 (an independent model's figure).
    [Fact]
    public void Speech_index_of_a_sharp_tank()
    {
        Reading reading = LoneTank(1240).Read(999e3, 0);
        Assert.Equal(0.592, reading.SpeechIndex!.Value, 0.002);
    }

    [Fact]
    public void Speech_index_is_1_for_a_flat_response_and_0_for_none()
    {
        Assert.Equal(1, SpeechIndex.Of(_ => 0), 12);
        Assert.Equal(0, SpeechIndex.Of(_ => -31), 12);
        Assert.Equal(0.5, SpeechIndex.Of(_ => -15), 12);   // half of the 30 dB in every band
    }

    // On tune an ideal detector hears a lone tank as 1/sqrt(1 + (2 Q f/f0)^2): 3, 6 and 10 dB at 1, sqrt3 and 3 half bandwidths (Terman).
    [Fact]
    public void Audio_is_3_6_and_10_decibels_down_at_the_half_bandwidths()
    {
        Reading reading = LoneTank(500).Read(1e6, 0);
        Assert.Equal(1000 * Math.Sqrt(Math.Pow(10, 0.3) - 1), reading.AudioDownHz.Db3!.Value, 3.0);
        Assert.Equal(1000 * Math.Sqrt(Math.Pow(10, 0.6) - 1), reading.AudioDownHz.Db6!.Value, 3.0);
        Assert.Equal(3000, reading.AudioDownHz.Db10!.Value, 6.0);
        Assert.Null(LoneTank(20).Read(1e6, 0).AudioDownHz.Db10);
    }

    // Of 1 + a e^jx + b e^-jx the part in quadrature, of amplitude |a - conj b|, lengthens the phasor by half its square: at small
    // depth the second harmonic is |a - conj b|^2/4 over |a + conj b| (series of the square root).
    [Fact]
    public void Second_harmonic_of_unlike_sidebands_at_small_depth_is_that_of_the_series()
    {
        StageUnderTest stage = LoneTank(1000);
        IReadOnlyList<ResponsePoint> h = StageReader.Response(stage.Workspace, new Setting(1e6, 0), [1.000e6, 1.001e6, 1.002e6]);
        System.Numerics.Complex At(int k) => System.Numerics.Complex.FromPolarCoordinates(Math.Pow(10, h[k].GainDb / 20), h[k].PhaseDegrees * Math.PI / 180);
        const double depth = 0.001;
        System.Numerics.Complex lower = depth / 2 * At(0) / At(1), upper = depth / 2 * At(2) / At(1);
        System.Numerics.Complex mirrored = System.Numerics.Complex.Conjugate(lower);
        double series = Math.Pow(System.Numerics.Complex.Abs(upper - mirrored), 2) / 4 / System.Numerics.Complex.Abs(upper + mirrored);
        var sidebands = new SidebandResponse(stage.Workspace, 1.001e6);
        Assert.Equal(series, sidebands.SecondHarmonic(1000, depth), series * 0.01);
        Assert.InRange(sidebands.SecondHarmonic(1000, 1), 0.001, 2);   // and stays a share of the fundamental where the series is lost
    }

    [Fact]
    public void Neighbours_stand_on_the_raster()
    {
        IReadOnlyList<Neighbour> neighbours = StageReader.Neighbours(LoneTank(500).Workspace, new Setting(1e6, 0));
        Assert.Equal([-20e3, -10e3, 10e3, 20e3], neighbours.Select(n => n.OffsetHz));
        Assert.Equal(-20.001, neighbours[2].RelativeDb, 0.01);   // 10 kHz off a Q of 500: the exact table of one tuned circuit
    }

    [Fact]
    public void Dial_degrees_and_hand_shift_follow_the_capacitor()
    {
        StageUnderTest stage = LoneTank(500);
        Reading reading = stage.Read(1e6, 0);
        Reading hand = stage.Read(new Setting(1e6, 0) { DialMode = DialMode.Locked, LockedFarad = reading.TuningFarad + 0.1e-12 });
        Assert.Equal(hand.TankHz!.Value - reading.TankHz!.Value, reading.HandShiftHz!.Value, Math.Abs(reading.HandShiftHz.Value) * 0.005);
        double faradPerDegree = (365e-12 - 12e-12) / 180;
        Reading turned = stage.Read(
            new Setting(1e6, 0) { DialMode = DialMode.Locked, LockedFarad = reading.TuningFarad + (0.01 * faradPerDegree) });
        double hzPerDegree = Math.Abs(turned.TankHz!.Value - reading.TankHz.Value) / 0.01;
        Assert.Equal(reading.BandwidthHz!.Value / hzPerDegree, reading.BandwidthDialDegrees!.Value, reading.BandwidthDialDegrees.Value * 0.005);
    }

    /// <summary>A tank whose loss is a parallel resistor set for its Q at 1 MHz, fed through next to nothing.</summary>
    private static StageUnderTest LoneTank(double q)
    {
        const double henry = 240e-6;
        double ohm = q * 2 * Math.PI * 1e6 * henry;
        return new StageUnderTest(FreeFamily.Design(
            [
                new Antenna("source", "source", Part.Earth), new Resistor("feed", "source", "top", 1e12),
                new Inductor("coil", "top", Part.Earth, henry), new Resistor("loss", "top", Part.Earth, ohm),
                new Capacitor("tuning", "top", Part.Earth, 100e-12) { Role = PartRole.Tuning },
            ],
            "top", new VariableCapacitor(12e-12, 365e-12)));
    }
}
