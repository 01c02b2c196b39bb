using System.Text;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>The key tables of the documentation are the fields of the families.</summary>
public sealed class KeyTableTests
{
    [Fact]
    public void The_documented_keys_are_those_of_the_families()
    {
        var text = new StringBuilder("# Keys of the stage file\n\nWritten from the program's own tables by the tests; the notation is explained in [stage-file.md](stage-file.md).\n");
        foreach (Family family in FamilyList.All)
        {
            text.Append($"\n## circuit = \"{family.Name}\"\n\n{family.Meaning}\n\n| key | meaning | value | default |\n| --- | --- | --- | --- |\n");
            foreach (Field field in family.Fields)
            {
                text.Append($"| `{field.Key}` | {field.Meaning}{Belonging(field)} | {Value(field)} | {Default(field)} |\n");
            }
        }

        Golden.CheckAt(text.ToString(), "docs", "stage-file-keys.md");
    }

    private static string Belonging(Field field) => field.OnlyWith is { } only ? $" (only with {Words(only)})" : "";

    private static string Words(FieldCondition condition) => $"`{condition.Key}` {string.Join(" or ", condition.Words.Select(word => $"`{word}`"))}";

    private static string Value(Field field) => field.Kind switch
    {
        FieldKind.Quantity => $"{QuantityText.Write(field.Minimum, field.Unit)} to {QuantityText.Write(field.Maximum, field.Unit)}",
        FieldKind.Count => $"whole number, {field.Minimum:0} to {field.Maximum:0}",
        FieldKind.Choice => string.Join(", ", field.Choices.Select(c => $"`{c}`")),
        FieldKind.Device => $"the name of {DeviceModel.Phrase(field.Socket)}",
        _ => "pairs `[[a, b], ...]`",
    };

    private static string Default(Field field) =>
        field.Required ? field.RequiredWith is { } with ? $"must be given with {Words(with)}" : "must be given"
        : field.Default is { } number ? QuantityText.Write(number, field.Unit)
        : field.DefaultText ?? "none";
}
