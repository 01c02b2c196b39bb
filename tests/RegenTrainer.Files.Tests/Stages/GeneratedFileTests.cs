using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>A thousand stage files of any layout: read as what was meant, written back byte for byte, changed in one place only.</summary>
public sealed class GeneratedFileTests
{
    private const int Files = 1000;

    public static TheoryData<string> Names => [.. Presets.Names];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_preset_that_was_read_is_written_byte_for_byte(string name) =>
        Assert.Equal(Presets.Text(name), StageText.Write(Presets.Text(name), Presets.Read(name)));

    [Fact]
    public void A_thousand_generated_files_are_written_byte_for_byte_and_changed_in_place()
    {
        StageDesign[] presets = [.. Presets.Names.Select(Presets.Read).Where(d => d.ExtraParts.IsEmpty)];
        for (int k = 0; k < Files; k++)
        {
            StageDesign design = Toleranced(presets[k % presets.Length], k);
            string text = new GeneratedText((ulong)(k + 1) * 0x9E3779B97F4A7C15UL).Of(design);
            StageDesign read = Read(text);
            Assert.Equal(Shown(design), Shown(read));
            Assert.True(text == StageText.Write(text, read), text);

            (string key, FieldValue value) = design.Values.ElementAt(k * 7 % design.Values.Count);
            if (value.Number is { } number and not 0 && design.Family.FieldFor(key)!.Kind == FieldKind.Quantity)
            {
                StageDesign other = read.With(key, value with { Number = number * 1.01 });
                string written = StageText.Write(text, other);
                Assert.Equal(Shown(other), Shown(Read(written)));
                Assert.Equal(1, text.Split('\n').Zip(written.Split('\n')).Count(l => l.First != l.Second));
                Assert.Equal(Shown(read), Shown(Read(StageText.Write(written, read))));
            }
        }
    }

    private static StageDesign Toleranced(StageDesign design, int k)
    {
        foreach (Field field in design.Family.Fields.Where(f => f.Kind == FieldKind.Quantity).Where((_, n) => n % 11 == k % 11))
        {
            design = design.Values.TryGetValue(field.Key, out FieldValue? value) ? design.With(field.Key, value with { TolerancePercent = 1 + (k % 9) }) : design;
        }

        return design;
    }

    private static StageDesign Read(string text)
    {
        StageReadResult result = StageText.Read(text, "generated.toml", DeviceShelf.Shipped);
        Assert.True(result.Design is not null, string.Join('\n', result.Faults) + "\n" + text);
        return result.Design;
    }

    private static string[] Shown(StageDesign design) =>
    [
        .. design.Values.Select(v => string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{v.Key} {v.Value.Number:R} {v.Value.Text} {v.Value.TolerancePercent:R} {string.Join(';', v.Value.Pairs)}")),
    ];
}
