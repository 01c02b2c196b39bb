using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>A control that turns the factor of an ideal feedback element, evenly over its rotation.</summary>
public static class FactorFields
{
    /// <summary>Factor at the idle stop.</summary>
    public const string Minimum = "regeneration.factor.min";

    /// <summary>Factor at full travel.</summary>
    public const string Maximum = "regeneration.factor.max";

    /// <summary>Rotation from stop to stop.</summary>
    public const string Mechanical = "regeneration.rotation.mechanical";

    /// <summary>The fields, in the order of the documentation.</summary>
    /// <param name="defaultMaximum">The factor at full travel where none is given; null for none.</param>
    public static IReadOnlyList<Field> With(double? defaultMaximum) =>
    [
        new(Minimum, "feedback factor at the idle stop", FieldKind.Quantity, Unit.None, 0, 1000) { Default = 0 },
        new(Maximum, "feedback factor at full travel", FieldKind.Quantity, Unit.None, 0, 1000) { Default = defaultMaximum },
        FieldOf.Rotation(Mechanical, "rotation of the factor's knob from stop to stop", 300),
    ];

    /// <summary>The control's law: travel to factor.</summary>
    internal static IControlLaw Build(StageDesign design) =>
        new LinearControl(design.Number(Minimum), design.Number(Maximum), design.Number(Mechanical));

    /// <summary>Adds a fault for a control that cannot be.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        if (design.NumberOrNull(Maximum) is null)
        {
            faults.Missing(Maximum, "the feedback factor at full travel");
        }

        faults.Ascending(design, Minimum, Maximum, Unit.None, "the factor at full travel");
    }
}
