using RegenTrainer.Core.Stages;

namespace RegenTrainer.Drawing;

/// <summary>A row of the list of parts: the heading of a section, or a field of it.</summary>
/// <param name="Section">The section: the first word of the keys in it.</param>
/// <param name="Field">The field; null for the section's heading.</param>
/// <param name="Label">What the field is called within its section.</param>
/// <param name="ShortLabel">The same beneath a row that says its first word already.</param>
internal sealed record PartRow(string Section, Field? Field, string Label, string ShortLabel)
{
    private const string Indent = "  ";

    /// <summary>The rows of a family, in the order of its fields.</summary>
    public static IReadOnlyList<PartRow> Of(Family family)
    {
        List<PartRow> rows = [];
        string[] above = [""];
        foreach (Field field in family.Fields)
        {
            string[] words = field.Key.Replace('_', ' ').Split('.');
            if (words[0] != above[0])
            {
                rows.Add(new PartRow(words[0], null, words[0], words[0]));
            }

            string label = string.Join(' ', words.Skip(1));
            bool beneath = words.Length > 2 && above.Length > 2 && words[0] == above[0] && words[1] == above[1];
            rows.Add(new PartRow(words[0], field, label, beneath ? Indent + string.Join(' ', words.Skip(2)) : label));
            above = words;
        }

        return rows;
    }
}
