using System.Text;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Writes the expansion of a design as a stage file of parts, which reads back to the same parts to the last bit.</summary>
public static class PartsText
{
    /// <summary>The expansion in the notation of stage files.</summary>
    /// <param name="design">A checked design of any family.</param>
    public static string Write(StageDesign design)
    {
        StageCircuit circuit = design.Family.Expand(design);
        var text = new StringBuilder();
        text.Append("format = ").Append(Notation.Quoted(StageReading.Format)).Append('\n');
        text.Append("title = ").Append(Notation.Quoted(design.Title)).Append('\n');
        text.Append("circuit = \"parts\"\n");
        text.Append("note = ").Append(Notation.Quoted(design.Note)).Append('\n');
        string table = "";
        foreach (Field field in PartsCircuit.Instance.Fields)
        {
            if (design.Family.FieldFor(field.Key) is null || !Concerns(circuit.Control, field.Key) || Value(design, field) is not { } value)
            {
                continue;
            }

            string name = field.Key[..field.Key.IndexOf('.', StringComparison.Ordinal)];
            if (name != table)
            {
                text.Append('\n').Append('[').Append(name).Append("]\n");
                table = name;
            }

            text.Append(field.Key.AsSpan(name.Length + 1)).Append(" = ").Append(value).Append('\n');
        }

        text.Append("\n[output]\nnode = ").Append(Notation.Quoted(circuit.OutputNode)).Append('\n');
        foreach (Part part in circuit.Parts)
        {
            text.Append('\n').Append(PartNotation.Write(part));
        }

        return text.ToString();
    }

    /// <summary>Whether a field of the table [regeneration] belongs to the control there is: a potentiometer or a factor.</summary>
    private static bool Concerns(RegenerationControl? control, string key) =>
        !key.StartsWith("regeneration.", StringComparison.Ordinal)
        || (control is not null && key.StartsWith("regeneration.potentiometer.", StringComparison.Ordinal) == (control.Unit == Unit.Ohm));

    private static string? Value(StageDesign design, Field field)
    {
        FieldValue? given = design.Values.GetValueOrDefault(field.Key);
        string? plain = field.Kind switch
        {
            FieldKind.Quantity or FieldKind.Count => design.NumberOrNull(field.Key) is { } number ? Notation.Number(number) : null,
            FieldKind.Pairs => given is null ? null
                : "[" + string.Join(", ", given.Pairs.Select(p => $"[{Notation.Number(p.First)}, {Notation.Number(p.Second)}]")) + "]",
            _ => design.WordOrNull(field.Key) is { } word ? Notation.Quoted(word) : null,
        };
        return plain is not null && given?.TolerancePercent is { } tolerance
            ? $"{{ value = {plain}, tolerance = \"{Notation.Number(tolerance)}%\" }}"
            : plain;
    }
}
