using System.Globalization;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Writes windings in the notation of parts: by geometry, by their core, or by the inductance of their sections.</summary>
internal static class WindingsNotation
{
    /// <summary>Writes the keys of windings behind kind and name.</summary>
    public static void Write(Windings part, Action<string, string> line, Action<string, double?> number)
    {
        switch (part.Model)
        {
            case Coil coil:
                int section = 0;
                for (int k = 0; k < coil.Geometry.Count; k++)
                {
                    Winding winding = coil.Geometry[k];
                    IEnumerable<string> nodes = part.SectionNodes.Skip(section).Take(winding.SectionCount).Select(n => n.To)
                        .Prepend(part.SectionNodes[section].From);
                    section += winding.SectionCount;
                    if (k == 0)
                    {
                        foreach ((string key, string value) in Geometry(winding, nodes))
                        {
                            line(key, value);
                        }
                    }
                }

                number("form_loss_q", coil.FormLossQ);
                if (coil.MeasuredQ is { } q)
                {
                    line("q", $"{{ value = {Notation.Number(q.Q)}, at = {Notation.Number(q.AtHz)} }}");
                }

                if (coil.Geometry.Count > 1)
                {
                    line("winding", Further(part, coil));
                }

                break;
            case CoupledSections sections:
                line("sections", "[" + string.Join(", ", sections.Sections.Select((s, i) =>
                    $"{{ between = {Names(part.SectionNodes[i].From, part.SectionNodes[i].To)}, inductance = {Notation.Number(s.Henry)}"
                    + (s.Q is { } own ? $", q = {Notation.Number(own)}" : "") + $", resistance = {Notation.Number(s.SeriesOhm)} }}")) + "]");
                if (sections.SelfCapacitanceFarad is [> 0 and double across])
                {
                    number("self_capacitance", across);
                }

                line("coupling", "[" + string.Join(", ", sections.Couplings.Select(c =>
                    $"[{c.First + 1}, {c.Second + 1}, {Notation.Number(c.Factor)}]")) + "]");
                break;
            case CoredCoil cored:
                WriteCored(part, cored, line, number);
                break;
            default:
                throw new NotSupportedException(part.Model.GetType().Name);
        }

        if (part.PickUp is { } pickUp)
        {
            string shares = Notation.List(pickUp.Shares.Select(Notation.Number));
            line("picks_up", pickUp.AreaSquareMetre is { } area ? $"{{ shares = {shares}, area = {Notation.Number(area)} }}" : $"{{ shares = {shares} }}");
        }
    }

    private static void WriteCored(Windings part, CoredCoil coil, Action<string, string> line, Action<string, double?> number)
    {
        number("inductance_factor", coil.HenryPerTurnSquared);
        line("turns", Whole(coil.Turns));
        line("taps", Notation.List(coil.TapTurns.Select(Whole)));
        line("nodes", Names(part.SectionNodes.Select(n => n.To).Prepend(part.SectionNodes[0].From)));
        number("section_coupling", coil.SectionCoupling);
        line("q", $"{{ value = {Notation.Number(coil.MeasuredQ.Q)}, at = {Notation.Number(coil.MeasuredQ.AtHz)} }}");
        if (coil.SelfCapacitanceFarad is [> 0 and double across])
        {
            number("self_capacitance", across);
        }

        number("wire_diameter", coil.Wire?.BareDiameterMetre);
        number("turn_length", coil.Wire?.TurnLengthMetre);
    }

    private static string Whole(int number) => number.ToString(CultureInfo.InvariantCulture);

    private static string Names(params IEnumerable<string> names) => Notation.List(names.Select(Notation.Quoted));

    private static string Further(Windings part, Coil coil)
    {
        List<string> windings = [];
        int section = coil.Geometry[0].SectionCount;
        foreach (Winding winding in coil.Geometry.Skip(1))
        {
            IEnumerable<string> nodes = part.SectionNodes.Skip(section).Take(winding.SectionCount).Select(n => n.To)
                .Prepend(part.SectionNodes[section].From);
            windings.Add("{ " + string.Join(", ", Geometry(winding, nodes).Select(p => $"{p.Key} = {p.Value}")) + " }");
            section += winding.SectionCount;
        }

        return "[" + string.Join(", ", windings) + "]";
    }

    private static IEnumerable<(string Key, string Value)> Geometry(Winding winding, IEnumerable<string> nodes)
    {
        yield return ("radius", Notation.Number(winding.RadiusMetre));
        yield return ("wire_diameter", Notation.Number(winding.Wire.BareDiameterMetre));
        yield return ("wire_over_insulation", Notation.Number(winding.Wire.OverInsulationMetre));
        yield return ("pitch", Notation.Number(winding.PitchMetre));
        yield return ("turns", Whole(winding.Turns));
        yield return ("taps", Notation.List(winding.TapTurns.Select(Whole)));
        yield return ("nodes", Names(nodes));
        yield return ("start", Notation.Number(winding.StartMetre));
    }
}
