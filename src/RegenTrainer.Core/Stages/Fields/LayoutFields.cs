using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The wiring of a stage: what leads add that nobody soldered in.</summary>
public static class LayoutFields
{
    /// <summary>Capacitance of each end of the control to the chassis.</summary>
    public const string ControlLead = "layout.control_lead";

    /// <summary>Capacitance of each lead to a tap of the coil.</summary>
    public const string TapLead = "layout.tap_lead";

    /// <summary>Capacitance of the lead to the base.</summary>
    public const string BaseLead = "layout.base_lead";

    /// <summary>Capacitance of the lead to a crystal detector.</summary>
    public const string DetectorLead = "layout.detector_lead";

    /// <summary>Inductance of each lead to the control.</summary>
    public const string LeadInductance = "layout.lead_inductance";

    /// <summary>The fields, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        FieldOf.Stray(ControlLead, "capacitance of each control lead to the chassis", 8e-12),
        FieldOf.Stray(TapLead, "capacitance of each tap lead to the chassis", 3e-12),
        FieldOf.Stray(BaseLead, "capacitance of the base lead to the chassis", 2e-12),
        FieldOf.Stray(DetectorLead, "capacitance of the lead to a crystal detector to the chassis", 3e-12),
        new(LeadInductance, "inductance of each control lead, 0 for none", FieldKind.Quantity, Unit.Henry, 0, 100e-6) { Default = 0 },
    ];
}
