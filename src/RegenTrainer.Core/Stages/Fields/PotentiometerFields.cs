using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>A potentiometer wired as a rheostat, its spare end tied to the wiper.</summary>
public static class PotentiometerFields
{
    /// <summary>Total resistance of the track.</summary>
    public const string Total = "regeneration.potentiometer.total";

    /// <summary>How the resistance follows the shaft.</summary>
    public const string Taper = "regeneration.potentiometer.taper";

    /// <summary>Resistance at mid rotation of a logarithmic track.</summary>
    public const string Mid = "regeneration.potentiometer.mid";

    /// <summary>Measured taper.</summary>
    public const string Table = "regeneration.potentiometer.table";

    /// <summary>Rotation from stop to stop.</summary>
    public const string Mechanical = "regeneration.potentiometer.rotation.mechanical";

    /// <summary>Rotation over which the resistance changes.</summary>
    public const string Electrical = "regeneration.potentiometer.rotation.electrical";

    /// <summary>Resistance left at the end of the travel.</summary>
    public const string End = "regeneration.potentiometer.end";

    /// <summary>Tolerance of the total resistance.</summary>
    public const string Tolerance = "regeneration.potentiometer.tolerance";

    /// <summary>Resistor across the control.</summary>
    public const string Shunt = "regeneration.potentiometer.shunt";

    /// <summary>Jump of the wiper's contact.</summary>
    public const string ContactJump = "regeneration.potentiometer.contact_jump";

    private const string Linear = "linear";
    private const string Logarithmic = "log";
    private const string ReverseLogarithmic = "reverse-log";
    private const string Measured = "table";

    private static readonly PairColumns _columns = new("rotation and resistance in percent", Unit.Percent, Unit.Percent);

    /// <summary>The fields of the potentiometer itself, in the order of the documentation.</summary>
    /// <param name="required">Whether a stage must have one.</param>
    public static IReadOnlyList<Field> With(bool required) =>
    [
        FieldOf.Resistance(Total, "total resistance of the potentiometer") with
        {
            Required = required,
            Minimum = 1,
            Tolerance = ToleranceKind.None,
            Series = PreferredSeries.E3,
        },
        FieldOf.Choice(Taper, "how the resistance follows the shaft", Linear, Linear, Logarithmic, ReverseLogarithmic, Measured),
        FieldOf.Percent(Mid, "resistance at mid rotation of a logarithmic track", 1, 49) with { Default = 15 },
        FieldOf.Pairs(Table, "measured taper: pairs of rotation and resistance in percent", 0, 100),
        FieldOf.Rotation(Mechanical, "rotation from stop to stop", 300),
        FieldOf.Rotation(Electrical, "rotation over which the resistance changes", 270),
        FieldOf.Resistance(End, "resistance left at the end of the track") with
        {
            Default = 20,
            Maximum = 100e3,
            Tolerance = ToleranceKind.None,
            Series = null,
        },
        FieldOf.Percent(Tolerance, "tolerance of the total resistance", 0, 50),
        FieldOf.Resistance(Shunt, "resistor across the control; none where not given"),
        FieldOf.Percent(ContactJump, "jump of the wiper's contact, in percent of the total", 0, 10) with { Default = 0.5 },
    ];

    /// <summary>The control's law: travel to resistance.</summary>
    internal static IControlLaw Build(StageDesign design) => new Potentiometer(
        design.Number(Total),
        design.Word(Taper) switch
        {
            Logarithmic => Controls.Taper.Logarithmic,
            ReverseLogarithmic => Controls.Taper.ReverseLogarithmic,
            Measured => Controls.Taper.Table,
            _ => Controls.Taper.Linear,
        },
        design.Number(Mid),
        design.Number(End),
        design.Number(Mechanical),
        design.Number(Electrical),
        design.NumberOrNull(Shunt),
        design.Values.TryGetValue(Table, out FieldValue? table) ? table.Pairs : null);

    /// <summary>Adds a fault for a potentiometer that cannot be.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        faults.Ascending(design, End, Total, Unit.Ohm, "the total resistance");
        double electrical = design.Number(Electrical);
        double mechanical = design.Number(Mechanical);
        if (electrical > mechanical)
        {
            faults.Add(
                Electrical,
                FaultList.Quantity(electrical, Unit.Degree),
                $"at most {FaultList.Quantity(mechanical, Unit.Degree)}, the rotation from stop to stop");
        }

        if (design.Word(Taper) == Measured && faults.Table(design, Table, _columns))
        {
            faults.OneWay(design, Table, _columns);
            IReadOnlyList<(double First, double Second)> pairs = design.Values[Table].Pairs;
            if (pairs[0] != (0, 0) || pairs[^1] != (100, 100))
            {
                faults.Add(
                    Table,
                    $"a track from {Pair(pairs[0])} to {Pair(pairs[^1])}",
                    $"one from {Pair((0, 0))} to {Pair((100, 100))}");
            }
        }
    }

    private static string Pair((double Rotation, double Resistance) pair) =>
        $"{FaultList.Quantity(pair.Rotation, Unit.Percent)}, {FaultList.Quantity(pair.Resistance, Unit.Percent)}";
}
