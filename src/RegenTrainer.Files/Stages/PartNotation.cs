using System.Text;
using RegenTrainer.Core.Circuits;
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
            Antenna a => ("antenna", () =>
            {
                if (a.Wire is { } wire)
                {
                    Line("wire", $"{{ length = {Notation.Number(wire.LengthMetre)}, height = {Notation.Number(wire.HeightMetre)}, diameter = {Notation.Number(wire.DiameterMetre)} }}");
                }
            }
            ),
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
            Windings w => ("windings", (Action)(() => WindingsNotation.Write(w, Line, Number))),
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

    private static string Names(params IEnumerable<string> names) => Notation.List(names.Select(Notation.Quoted));
}
