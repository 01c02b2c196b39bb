using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Oracles;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>What must not matter does not: names, order, splitting, impedance level, polarity, hints.</summary>
public sealed class InvarianceTests
{
    private static readonly VariableCapacitor _capacitor = new(12e-12, 365e-12, q: 1500);
    private static readonly (double Dial, double Travel)[] _settings = [(600e3, 20), (1e6, 50), (1.6e6, 40)];

    [Fact]
    public void Names_of_nodes_do_not_matter()
    {
        Dictionary<string, string> names = [];
        string Other(string node) => node == Part.Earth ? node
            : names.TryGetValue(node, out string? given) ? given : names[node] = $"{(char)('z' - names.Count)}{names.Count}";
        AssertSameReadings([.. Parts().Select(p => Renamed(p, Other))], output: Other("output"));
    }

    [Fact]
    public void Order_of_parts_does_not_matter()
    {
        var random = new CounterRandom(3);
        AssertSameReadings([.. Parts().OrderBy(_ => random.Next())]);
    }

    [Fact]
    public void A_resistor_may_be_two()
    {
        AssertSameReadings(
        [
            .. Parts().SelectMany(p => p is Resistor { Name: "collector resistor" } r
                ? new Part[] { r with { Ohm = 0.3 * r.Ohm, To = "middle" }, r with { Name = "rest", Ohm = 0.7 * r.Ohm, From = "middle" } }
                : [p]),
        ]);
    }

    [Fact]
    public void All_impedances_may_be_three_times_as_high()
    {
        StageDesign scaled = FreeFamily.Design(
            [.. Parts().Select(Tripled)], "output", new VariableCapacitor(4e-12, 365e-12 / 3, q: 1500),
            new Potentiometer(30e3, Taper.ReverseLogarithmic, 15, 60));
        var (plain, high) = (new StageUnderTest(Design(Parts(), "output")), new StageUnderTest(scaled));
        foreach ((double dial, double travel) in _settings)
        {
            Reading a = plain.Read(new Setting(dial, travel), 1000, 3000), b = high.Read(new Setting(dial, travel), 1000, 3000);
            ReadingComparison.AssertSame(a, b, farads: 1 / 3.0, ohms: 3);
        }
    }

    [Fact]
    public void A_pnp_mirror_equals_the_npn_stage()
    {
        BipolarModel pnp = DefaultStage.Bc547b with { Name = "mirror", Polarity = Polarity.Pnp };
        StageDesign mirror = DefaultStage.Design with
        {
            Devices = DefaultStage.Design.Devices.SetItem("devices.main", pnp).SetItem("devices.follower", pnp),
        };
        var (plain, turned) = (StageUnderTest.Default, new StageUnderTest(mirror));
        foreach ((double dial, double travel) in _settings)
        {
            ReadingComparison.AssertSame(
                plain.Read(new Setting(dial, travel), 1000, 3000), turned.Read(new Setting(dial, travel), 1000, 3000));
        }
    }

    [Fact]
    public void Hints_save_time_and_change_nothing()
    {
        StageUnderTest stage = StageUnderTest.Default;
        var fresh = new StageWorkspace(stage.Model);
        var random = new CounterRandom(11);
        TankHint hint = TankHint.None;
        for (int k = 0; k < 300; k++)
        {
            var query = new TankQuery(
                random.NextLog(540e3, 1.69e6),
                random.Next() < 0.5 ? DialMode.Follows : DialMode.Locked,
                random.NextLog(15e-12, 350e-12),
                random.NextLog(100, 10e3),
                random.Next() * 40,
                (Grade)(int)(random.Next() * 3),
                2 + random.Next(),
                null,
                random.Next() < 0.2);
            TankState hinted = TankSolver.Solve(stage.Workspace, query, hint), cold = TankSolver.Solve(fresh, query, TankHint.None);
            Assert.True(cold.Found, $"{k}: {cold.Stop}");
            Assert.True(hinted.Found, $"{k}: {hinted.Stop}");
            DefaultStageTests.AssertSame(cold.Mode.S.Real, hinted.Mode.S.Real, 1e-7);   // a difference of nearly equal rates near tip-over
            Assert.True(Math.Abs(cold.Mode.S.Real - hinted.Mode.S.Real) <= 1e-12 * cold.Mode.S.Imaginary, $"{k}");
            DefaultStageTests.AssertSame(cold.Mode.S.Imaginary, hinted.Mode.S.Imaginary);
            DefaultStageTests.AssertSame(cold.Mode.TuningFarad, hinted.Mode.TuningFarad);
            hint = TankHint.From(hinted);
        }
    }

    private static IReadOnlyList<Part> Parts() => StageUnderTest.Default.Model.Network.Parts;

    private static StageDesign Design(IReadOnlyList<Part> parts, string output) =>
        FreeFamily.Design(parts, output, _capacitor, new Potentiometer(10e3, Taper.ReverseLogarithmic, 15, 20));

    private static void AssertSameReadings(IReadOnlyList<Part> parts, string output = "output")
    {
        var (plain, other) = (StageUnderTest.Default, new StageUnderTest(Design(parts, output)));
        foreach ((double dial, double travel) in _settings)
        {
            ReadingComparison.AssertSame(
                plain.Read(new Setting(dial, travel), 1000, 3000), other.Read(new Setting(dial, travel), 1000, 3000));
        }
    }

    private static Part Renamed(Part part, Func<string, string> name) => part switch
    {
        Feedback f => f with { SenseFrom = name(f.SenseFrom), SenseTo = name(f.SenseTo), OutFrom = name(f.OutFrom), OutTo = name(f.OutTo) },
        Bipolar q => q with { Base = name(q.Base), Collector = name(q.Collector), Emitter = name(q.Emitter) },
        Windings w => w with { SectionNodes = [.. w.SectionNodes.Select(s => (name(s.From), name(s.To)))] },
        TwoTerminalPart t => t with { From = name(t.From), To = name(t.To) },
        _ => part,
    };

    /// <summary>Voltages stay, currents fall to a third: resistances and inductances three times, capacitances a third.</summary>
    private static Part Tripled(Part part) => part switch
    {
        Resistor r => r with { Ohm = 3 * r.Ohm },
        Capacitor c => c with { Farad = c.Farad / 3 },
        Supply s => s with { SeriesOhm = 3 * s.SeriesOhm },
        Windings w => w with { Model = new TripledWindings(w.Model) },
        Bipolar q => q with { Model = Tripled(q.Model) },
        _ => part,
    };

    private static BipolarModel Tripled(BipolarModel m)
    {
        static DeviceFigure Times(DeviceFigure f, double value, double at = 1) =>
            new(f.Minimum * value, f.Typical * value, f.Maximum * value, f.At * at, f.Known, f.Source);
        return m with
        {
            CurrentGain = Times(m.CurrentGain, 1, 1 / 3.0),
            CurrentGainLow = Times(m.CurrentGainLow!, 1, 1 / 3.0),
            TransitionFrequency = Times(m.TransitionFrequency, 1, 1 / 3.0),
            OutputCapacitance = Times(m.OutputCapacitance, 1 / 3.0),
            InputCapacitance = Times(m.InputCapacitance, 1 / 3.0),
            SaturationCurrent = Times(m.SaturationCurrent, 1 / 3.0),
            BaseResistance = Times(m.BaseResistance, 3),
        };
    }

    private sealed class TripledWindings(IWindingModel plain) : IWindingModel
    {
        public int SectionCount => plain.SectionCount;

        public IReadOnlyList<WindingSpan> Windings =>
            [.. plain.Windings.Select(w => w with { SelfCapacitanceFarad = w.SelfCapacitanceFarad / 3 })];

        public IReadOnlyList<double> SelfCapacitanceFarad => [.. plain.SelfCapacitanceFarad.Select(c => c / 3)];

        public double Henry(int i, int j) => 3 * plain.Henry(i, j);

        public double DcOhm(int section, double temperatureCelsius) => 3 * plain.DcOhm(section, temperatureCelsius);

        public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix)
        {
            plain.SeriesOhm(hz, temperatureCelsius, matrix);
            foreach (ref double ohm in matrix)
            {
                ohm *= 3;
            }
        }

        public IReadOnlyList<Caution> CautionsAt(double hz) => plain.CautionsAt(hz);
    }
}
