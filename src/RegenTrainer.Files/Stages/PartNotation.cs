using System.Globalization;
using System.Text;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Writes one part as a [[part]] table with plain SI numbers that read back to the last bit.</summary>
internal static class PartNotation
{
    /// <summary>The table's text, header line first.</summary>
    public static string Write(Part part)
    {
        var lines = new StringBuilder("[[part]]\n");
        void Line(string key, string value) => lines.Append(key).Append(" = ").Append(value).Append('\n');
        void Number(string key, double? value)
        {
            if (value is { } number)
            {
                Line(key, Notation.Number(number));
            }
        }

        (string kind, Action body) = part switch
        {
            Resistor r => ("resistor", () => Number("value", r.Ohm)),
            Capacitor c => ("capacitor", () =>
            {
                Number("value", c.Farad);
                Number("q", c.Q);
            }
            ),
            Inductor l => ("inductor", () =>
            {
                Number("value", l.Henry);
                Number("resistance", l.SeriesOhm);
                Number("q", l.Q);
            }
            ),
            Bead b => ("bead", () =>
            {
                Number("resistance", b.Ohm);
                Number("inductance", b.Henry);
                Number("capacitance", b.Farad);
            }
            ),
            Supply s => ("supply", () =>
            {
                Number("voltage", s.Volt);
                Number("resistance", s.SeriesOhm);
            }
            ),
            Antenna => ("antenna", () => { }),
            Bipolar q => ("bipolar", () =>
            {
                Line("device", Notation.Quoted(q.Model.Name));
                Line("nodes", $"{{ base = {Notation.Quoted(q.Base)}, collector = {Notation.Quoted(q.Collector)}, emitter = {Notation.Quoted(q.Emitter)} }}");
            }
            ),
            Diode d => ("diode", () =>
            {
                Line("device", Notation.Quoted(d.Model.Name));
                Line("nodes", $"{{ anode = {Notation.Quoted(d.Anode)}, cathode = {Notation.Quoted(d.Cathode)} }}");
            }
            ),
            Feedback f => ("feedback", () =>
            {
                Line("sense", Names(f.SenseFrom, f.SenseTo));
                Line("drive", Names(f.OutFrom, f.OutTo));
                Number("transconductance", f.Siemens);
                Number("factor", f.Factor);
            }
            ),
            Windings w => ("windings", (Action)(() => Write(w, Line, Number))),
            _ => throw new NotSupportedException(part.GetType().Name),
        };
        Line("kind", Notation.Quoted(kind));
        Line("name", Notation.Quoted(part.Name));
        if (part is TwoTerminalPart two)
        {
            Line("between", Names(two.From, two.To));
        }

        body();
        if (part.Role != PartRole.None)
        {
            Line("role", Notation.Quoted(part.Role.ToString().ToLowerInvariant()));
        }

        return lines.ToString();
    }

    private static string Names(params IEnumerable<string> names) => $"[{string.Join(", ", names.Select(Notation.Quoted))}]";

    private static void Write(Windings part, Action<string, string> line, Action<string, double?> number)
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
            default:
                throw new NotSupportedException(part.Model.GetType().Name);
        }
    }

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
        yield return ("turns", winding.Turns.ToString(CultureInfo.InvariantCulture));
        yield return ("taps", $"[{string.Join(", ", winding.TapTurns.Select(t => t.ToString(CultureInfo.InvariantCulture)))}]");
        yield return ("nodes", Names(nodes));
        yield return ("start", Notation.Number(winding.StartMetre));
    }
}
