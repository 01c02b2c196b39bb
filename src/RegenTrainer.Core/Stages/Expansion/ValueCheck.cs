using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>Whether the figures of parts are such that a network can be made of them.</summary>
internal static class ValueCheck
{
    /// <summary>Adds a fault for every figure that no such part can have.</summary>
    public static void Check(IReadOnlyList<Part> parts, FaultList faults)
    {
        foreach (Part part in parts)
        {
            switch (part)
            {
                case Resistor resistor:
                    Positive(part, resistor.Ohm, Unit.Ohm, faults);
                    break;
                case Capacitor capacitor:
                    Positive(part, capacitor.Farad, Unit.Farad, faults);
                    Positive(part, capacitor.Q ?? 1, Unit.None, faults);
                    break;
                case Inductor inductor:
                    Positive(part, inductor.Henry, Unit.Henry, faults);
                    NotNegative(part, inductor.SeriesOhm, Unit.Ohm, faults);
                    Positive(part, inductor.Q ?? 1, Unit.None, faults);
                    break;
                case Bead bead:
                    Positive(part, bead.Ohm, Unit.Ohm, faults);
                    Positive(part, bead.Henry, Unit.Henry, faults);
                    NotNegative(part, bead.Farad, Unit.Farad, faults);
                    break;
                case Supply supply:
                    Finite(part, supply.Volt, Unit.Volt, faults);
                    NotNegative(part, supply.SeriesOhm, Unit.Ohm, faults);
                    break;
                case Feedback feedback:
                    Finite(part, feedback.Siemens, Unit.Siemens, faults);
                    Finite(part, feedback.Factor, Unit.None, faults);
                    break;
                case Windings windings when windings.SectionNodes.Count != windings.Model.SectionCount:
                    faults.Add(
                        CircuitCheck.Key(part),
                        $"nodes for {windings.SectionNodes.Count} of the sections",
                        $"nodes for each of the {windings.Model.SectionCount} sections of the windings");
                    break;
                case Windings { PickUp: { } pickUp } windings when pickUp.Shares.Count != windings.Model.SectionCount:
                    faults.Add(
                        CircuitCheck.Key(part),
                        $"{pickUp.Shares.Count} shares of the antenna's electromotive force",
                        $"one for each of the {windings.Model.SectionCount} sections of the windings");
                    break;
                default:
                    break;
            }
        }
    }

    private static void Positive(Part part, double value, Unit unit, FaultList faults) =>
        Need(double.IsFinite(value) && value > 0, part, value, unit, "a finite value above 0", faults);

    private static void NotNegative(Part part, double value, Unit unit, FaultList faults) =>
        Need(double.IsFinite(value) && value >= 0, part, value, unit, "a finite value, 0 or more", faults);

    private static void Finite(Part part, double value, Unit unit, FaultList faults) =>
        Need(double.IsFinite(value), part, value, unit, "a finite value", faults);

    private static void Need(bool sound, Part part, double value, Unit unit, string expected, FaultList faults)
    {
        if (!sound)
        {
            faults.Add(CircuitCheck.Key(part), FaultList.Quantity(value, unit), expected);
        }
    }
}
