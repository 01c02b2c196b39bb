using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>A save changes what was changed, in the builder's own notation, and nothing else.</summary>
public sealed class StageWritingTests
{
    private static readonly string _text = Presets.Text(Presets.Default);
    private static readonly StageDesign _design = Presets.Read(Presets.Default);

    [Fact]
    public void One_value_changes_one_line_and_keeps_its_comment()
    {
        string written = Write(_design.With("coil.turns", FieldValue.Of(80)).With("bias.collector_resistor", FieldValue.Of(820)));
        string[] before = _text.Split('\n'), after = written.Split('\n');
        Assert.Equal(before.Length, after.Length);
        Assert.Equal(["turns = 80", "collector_resistor = \"820\""], after.Except(before));
        Assert.Contains("wire_diameter = \"0.4 mm\"         # bare copper", after);
    }

    [Theory]
    [InlineData("bias.base_coupling", 270e-12, "base_coupling = \"270p\"")]
    [InlineData("dial.low", 531e3, "low  = \"531k\"")]
    [InlineData("dial.capacitor.max", 500e-12, "max = \"500p\"")]
    [InlineData("coil.taps.base", 26, "base = 26 }   # turns from the earthed end")]
    [InlineData("regeneration.potentiometer.total", 4700, "{ total = \"4k7\", taper")]
    [InlineData("coil.form_loss_q", 512.5, "form_loss_q = 512.5")]
    [InlineData("bias.supply", 3.1234567, "supply = \"3.1234567\"")]
    public void A_value_is_written_as_the_trade_writes_it_and_reads_back_exactly(string key, double number, string line)
    {
        StageDesign changed = _design.With(key, FieldValue.Of(number));
        string written = Write(changed);
        Assert.Contains(line, written, StringComparison.Ordinal);
        Assert.Equal(number, StageText.Read(written, "x", DeviceShelf.Shipped).Design!.Number(key));
    }

    [Fact]
    public void A_value_that_was_not_there_is_added_to_its_table()
    {
        string written = Write(_design
            .With("coil.q.value", FieldValue.Of(180)).With("coil.q.at", FieldValue.Of(1e6))
            .With("dial.padder", FieldValue.Of(1e-9))
            .With("tolerance.capacitor", FieldValue.Of(20)));
        StageReadResult back = StageText.Read(written, "x", DeviceShelf.Shipped);
        Assert.Empty(back.Faults);
        Assert.Equal(180, back.Design!.Number("coil.q.value"));
        Assert.Equal(1e-9, back.Design.Number("dial.padder"));
        Assert.Equal(20, back.Design.Number("tolerance.capacitor"));
        Assert.StartsWith(_text.Split("[coil]")[0].Split("stray   =")[0], written, StringComparison.Ordinal);
    }

    [Fact]
    public void A_removed_value_leaves_with_its_line_or_its_comma()
    {
        string written = Write(_design with { Values = _design.Values.Remove("coil.pitch").Remove("dial.capacitor.q").Remove("bias.base_stopper") });
        StageReadResult back = StageText.Read(written, "x", DeviceShelf.Shipped);
        Assert.Empty(back.Faults);
        Assert.False(back.Design!.Gives("coil.pitch"));
        Assert.False(back.Design.Gives("dial.capacitor.q"));
        Assert.Contains("law = \"straight-line-capacitance\" }", written, StringComparison.Ordinal);
        Assert.Equal(_text.Split('\n').Length - 2, written.Split('\n').Length);
    }

    [Fact]
    public void A_tolerance_becomes_a_table_and_goes_again()
    {
        StageDesign toleranced = _design.With("bias.collector_resistor", new FieldValue(680, null, 1));
        string written = Write(toleranced);
        Assert.Contains("collector_resistor = { value = \"680\", tolerance = \"1%\" }", written, StringComparison.Ordinal);
        string other = StageText.Write(written, toleranced.With("bias.collector_resistor", new FieldValue(820, null, 1)));
        Assert.Contains("{ value = \"820\", tolerance = \"1%\" }", other, StringComparison.Ordinal);
        Assert.Equal(_text, StageText.Write(written, _design));
    }

    [Fact]
    public void Title_note_and_device_are_written_and_hostile_text_is_escaped()
    {
        DeviceModel strong = DeviceShelf.Shipped.Find("2n5088")!.Model!;
        StageDesign changed = _design with
        {
            Title = "a \"quoted\" \\ title\n\u0007",
            Note = "",
            Devices = _design.Devices.SetItem("devices.main", strong),
        };
        changed = changed.With("devices.main", FieldValue.Of("2N5088"));
        StageDesign back = StageText.Read(Write(changed), "x", DeviceShelf.Shipped).Design!;
        Assert.Equal(changed.Title, back.Title);
        Assert.Equal("", back.Note);
        Assert.Equal("2N5088", back.Devices["devices.main"].Name);
    }

    [Fact]
    public void Windows_line_ends_stay()
    {
        string text = _text.ReplaceLineEndings("\r\n");
        string written = StageText.Write(text, _design.With("tolerance.capacitor", FieldValue.Of(20)));
        Assert.DoesNotContain('\n', written.Replace("\r\n", "", StringComparison.Ordinal));
        Assert.Equal(text, StageText.Write(text, _design));
    }

    [Fact]
    public void A_thousand_random_edits_read_back_and_undo_byte_for_byte()
    {
        string text = _text;
        StageDesign design = _design;
        Field[] fields = [.. design.Family.Fields.Where(f => f.Kind == FieldKind.Quantity && design.Gives(f.Key))];
        for (int k = 0; k < 1000; k++)
        {
            Field field = fields[k * 7 % fields.Length];
            double number = design.Number(field.Key) * (1 + (((k * 37 % 11) - 5) / 1000.0));
            if (number < field.Minimum || number > field.Maximum)
            {
                continue;
            }

            StageDesign next = design.With(field.Key, FieldValue.Of(number));
            if (next.Family.Check(next).Count > 0)
            {
                continue;
            }

            text = StageText.Write(text, next);
            Assert.Equal(number, StageText.Read(text, "x", DeviceShelf.Shipped).Design!.Number(field.Key));
            design = next;
        }

        Assert.Equal(_text, StageText.Write(text, _design));
    }

    private static string Write(StageDesign design) => StageText.Write(_text, design);
}
