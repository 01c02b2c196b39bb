using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>Whether the parts with a role can play it.</summary>
internal static class RoleCheck
{
    /// <summary>Adds a fault for every role that is missing, taken twice or given to the wrong kind of part.</summary>
    public static void Check(IReadOnlyList<Part> parts, FaultList faults)
    {
        int tuning = 0;
        int regeneration = 0;
        foreach (Part part in parts)
        {
            switch (part.Role)
            {
                case PartRole.Tuning:
                    tuning++;
                    OneAtMost(part, tuning, "tuning", faults);
                    OfKind(part, part is Capacitor, "tuning", "a capacitor", faults);
                    break;
                case PartRole.Regeneration:
                    regeneration++;
                    OneAtMost(part, regeneration, "regeneration", faults);
                    OfKind(part, part is Resistor or Feedback, "regeneration", "a resistor or a feedback element", faults);
                    break;
                case PartRole.Regenerating:
                    OfKind(part, part is Bipolar or Feedback, "regenerating", "a bipolar device or a feedback element", faults);
                    break;
                default:
                    break;
            }
        }

        if (tuning == 0)
        {
            faults.Add("part", "no part with the role \"tuning\"", "one capacitor with the role \"tuning\", the one the dial turns");
        }
    }

    private static void OneAtMost(Part part, int count, string role, FaultList faults)
    {
        if (count > 1)
        {
            faults.Add(CircuitCheck.Key(part), $"a second part with the role \"{role}\"", "one at most");
        }
    }

    private static void OfKind(Part part, bool fits, string role, string expected, FaultList faults)
    {
        if (!fits)
        {
            faults.Add(CircuitCheck.Key(part), $"the role \"{role}\" on {KindOf(part)}", expected);
        }
    }

    private static string KindOf(Part part) => part switch
    {
        Resistor => "a resistor",
        Capacitor => "a capacitor",
        Inductor => "an inductor",
        Bead => "a bead",
        Windings => "windings",
        Supply => "a supply",
        Antenna => "an antenna",
        Feedback => "a feedback element",
        Bipolar => "a bipolar device",
        Diode => "a diode",
        _ => "another kind of part",
    };
}
