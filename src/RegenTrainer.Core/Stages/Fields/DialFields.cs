using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The band of a stage and the capacitor that covers it.</summary>
public static class DialFields
{
    /// <summary>Low end of the band.</summary>
    public const string Low = "dial.low";

    /// <summary>High end of the band.</summary>
    public const string High = "dial.high";

    /// <summary>Channel raster.</summary>
    public const string Step = "dial.step";

    /// <summary>Smallest capacitance of the tuning capacitor.</summary>
    public const string Minimum = "dial.capacitor.min";

    /// <summary>Largest capacitance of the tuning capacitor.</summary>
    public const string Maximum = "dial.capacitor.max";

    /// <summary>How the capacitance follows the shaft.</summary>
    public const string Law = "dial.capacitor.law";

    /// <summary>Q of the tuning capacitor.</summary>
    public const string Q = "dial.capacitor.q";

    /// <summary>Measured law of the tuning capacitor.</summary>
    public const string Table = "dial.capacitor.table";

    /// <summary>Capacitor in series with the tuning capacitor.</summary>
    public const string Padder = "dial.padder";

    /// <summary>Set capacitor across the tank.</summary>
    public const string Trimmer = "dial.trimmer";

    /// <summary>Wiring capacitance across the tank.</summary>
    public const string Stray = "dial.stray";

    private const string LinearCapacitance = "straight-line-capacitance";
    private const string LinearWavelength = "straight-line-wavelength";
    private const string LinearFrequency = "straight-line-frequency";
    private const string Measured = "table";
    private const double LargestFarad = 100e-9;

    private static readonly PairColumns _columns = new("degrees and farad", Unit.Degree, Unit.Farad);

    /// <summary>The band and the variable capacitor: what every stage has.</summary>
    public static IReadOnlyList<Field> Band { get; } =
    [
        FieldOf.Frequency(Low, "low end of the band") with { Required = true },
        FieldOf.Frequency(High, "high end of the band") with { Required = true },
        new(Step, "channel raster", FieldKind.Quantity, Unit.Hertz, 100, 1e6) { Default = 10e3 },
        FieldOf.Capacitance(Minimum, "tuning capacitor, plates out; a measured one says so itself") with { Maximum = LargestFarad, Series = null },
        FieldOf.Capacitance(Maximum, "tuning capacitor, plates in; a measured one says so itself") with { Maximum = LargestFarad, Series = null },
        FieldOf.Choice(
            Law, "how the capacitance follows the shaft", LinearCapacitance, LinearCapacitance, LinearWavelength, LinearFrequency, Measured),
        FieldOf.Pairs(Table, "measured capacitor: pairs of degrees and farad", 0, 3600),
    ];

    /// <summary>The band, the variable capacitor with its Q and the fixed capacitors around it.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        .. Band,
        FieldOf.Quality(Q, "Q of the tuning capacitor") with { Default = 1500 },
        FieldOf.Capacitance(Padder, "capacitor in series with the tuning capacitor; none where not given"),
        FieldOf.Capacitance(Trimmer, "set capacitor across the tank; none where not given") with { Maximum = 10e-9, Series = null },
        FieldOf.Stray(Stray, "wiring capacitance across the tank", 6e-12),
    ];

    /// <summary>The dial of a design.</summary>
    public static Dial Build(StageDesign design) =>
        new(design.Number(Low), design.Number(High), design.Number(Step), BuildCapacitor(design));

    /// <summary>Adds the tuning capacitor, its padder, the trimmer and the wiring capacitance between a node and earth.</summary>
    internal static void AddParts(StageDesign design, PartList parts, string tankTop)
    {
        string plates = parts.ThroughCapacitor("padder", tankTop, design.NumberOrNull(Padder), "tuning plates");
        double farad = BuildCapacitor(design).MaximumFarad;
        parts.Add(new Capacitor("tuning capacitor", plates, Part.Earth, farad, design.Number(Q)) { Role = PartRole.Tuning });
        parts.AddCapacitor("trimmer", tankTop, Part.Earth, design.NumberOrNull(Trimmer));
        parts.AddCapacitor("tank wiring", tankTop, Part.Earth, design.Number(Stray));
    }

    private static VariableCapacitor BuildCapacitor(StageDesign design)
    {
        if (design.Word(Law) == Measured)
        {
            IReadOnlyList<(double Degrees, double Farad)> pairs = design.Values[Table].Pairs;
            return new VariableCapacitor(pairs[0].Farad, pairs[^1].Farad, CapacitorLaw.Table, design.NumberOrNull(Q), pairs);
        }

        CapacitorLaw law = design.Word(Law) switch
        {
            LinearWavelength => CapacitorLaw.StraightLineWavelength,
            LinearFrequency => CapacitorLaw.StraightLineFrequency,
            _ => CapacitorLaw.StraightLineCapacitance,
        };
        return new VariableCapacitor(design.Number(Minimum), design.Number(Maximum), law, design.NumberOrNull(Q));
    }

    /// <summary>Adds a fault for a band or a capacitor that is missing or upside down.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        faults.Ascending(design, Low, High, Unit.Hertz, "the high end of the band");
        if (design.Word(Law) == Measured)
        {
            CheckTable(design, faults);
            return;
        }

        foreach (string key in new[] { Minimum, Maximum }.Where(k => design.NumberOrNull(k) is null))
        {
            faults.Missing(key, $"the capacitance, or \"{Measured}\" as {Law} and measured pairs as {Table}");
        }

        faults.Ascending(design, Minimum, Maximum, Unit.Farad, "the capacitor with its plates in");
    }

    private static void CheckTable(StageDesign design, FaultList faults)
    {
        if (!faults.Table(design, Table, _columns))
        {
            return;
        }

        faults.OneWay(design, Table, _columns);
        double start = design.Values[Table].Pairs[0].First;
        if (start != 0)
        {
            faults.Add(Table, $"a first pair at {FaultList.Quantity(start, Unit.Degree)}", "0 degrees, plates out, as the first pair");
        }

        Field range = FieldOf.Capacitance(Table, "");
        foreach ((_, double farad) in design.Values[Table].Pairs.Where(p => p.Second < range.Minimum || p.Second > LargestFarad))
        {
            faults.Add(
                Table,
                FaultList.Quantity(farad, Unit.Farad),
                $"{FaultList.Quantity(range.Minimum, Unit.Farad)} to {FaultList.Quantity(LargestFarad, Unit.Farad)}");
            return;
        }
    }
}
