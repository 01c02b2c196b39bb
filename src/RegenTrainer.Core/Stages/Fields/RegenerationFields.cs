using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The rheostat between the emitter and its tap.</summary>
public static class RegenerationFields
{
    /// <summary>What the control turns.</summary>
    public const string Control = "regeneration.control";

    /// <summary>Resistor in series with the control.</summary>
    public const string SeriesValue = "regeneration.series.value";

    /// <summary>Which end of the control the series resistor sits at.</summary>
    public const string SeriesAt = "regeneration.series.at";

    private const string EmitterRheostat = "emitter-rheostat";
    private const string AtDevice = "device";
    private const string AtTap = "tap";

    /// <summary>The fields, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        FieldOf.Choice(Control, "what the control turns", EmitterRheostat, EmitterRheostat),
        .. PotentiometerFields.With(required: true),
        FieldOf.SeriesResistance(SeriesValue, "resistor in series with the control; none where not given"),
        FieldOf.Choice(SeriesAt, "which end of the control the series resistor sits at", AtDevice, AtDevice, AtTap),
    ];

    /// <summary>
    /// Adds the way from the emitter over the control to its tap. The leads to the control have capacitance to the chassis at
    /// both ends of the control, and inductance where the layout says so; the series resistor sits on its own end of the lead.
    /// </summary>
    internal static void AddParts(StageDesign design, PartList parts, IControlLaw law, string emitter, string emitterTap)
    {
        double? series = design.NumberOrNull(SeriesValue);
        double lead = design.Number(LayoutFields.LeadInductance);
        double stray = design.Number(LayoutFields.ControlLead);
        bool atTap = design.Word(SeriesAt) == AtTap;

        string deviceEnd = Approach(parts, "device", emitter, atTap ? null : series, lead);
        string tapEnd = Approach(parts, "tap", emitterTap, atTap ? series : null, lead);
        parts.Add(new Resistor("regeneration control", deviceEnd, tapEnd, law.ValueAtStart) { Role = PartRole.Regeneration });
        parts.AddCapacitor("control wiring at device", deviceEnd, Part.Earth, stray);
        parts.AddCapacitor("control wiring at tap", tapEnd, Part.Earth, stray);
    }

    /// <summary>Goes from a fixed node through the series resistor, where it sits here, and the lead to an end of the control.</summary>
    /// <returns>The node of that end of the control.</returns>
    private static string Approach(PartList parts, string side, string start, double? series, double lead)
    {
        string end = $"control {side} end";
        string behindSeries = parts.ThroughResistor("series resistor", start, series, lead > 0 ? "series end" : end);
        return parts.ThroughLead($"control lead at {side}", behindSeries, lead, end);
    }
}
