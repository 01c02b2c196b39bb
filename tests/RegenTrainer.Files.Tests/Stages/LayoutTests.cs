using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>However a builder lays out a stage file, by headers, dots or braces, a save puts values where they belong.</summary>
public sealed class LayoutTests
{
    private const string Headers = """
        format = "regentrainer.stage/1"
        title = "by headers"
        circuit = "plain-tank"

        [dial.capacitor]
        min = "12p"   # plates out
        max = "365p"
        [dial]
        low = "530 kHz"
        high = "1.7 MHz"
        [regeneration]
        # nothing of its own
        [regeneration.factor]
        max = 0.02
        [antenna]
        coupling = "5p"
        """;

    private const string Dots = """
        format = "regentrainer.stage/1"
        title = 'by dots'
        circuit = "plain-tank"
        dial.low = 530e3
        dial.high = 1700e3
        dial.capacitor.min = 12e-12
        dial.capacitor.max = 365e-12
        antenna.coupling = "5p" # to the top

        [regeneration]
        factor.max = 0.02
        """;

    private const string Braces = """
        format = "regentrainer.stage/1"
        title = "by braces"
        circuit = "plain-tank"
        dial = { low = "530k", high = "1700k", capacitor = { min = "12p", max = "365p" } }
        antenna = { coupling = { value = "5p", tolerance = 5 } }
        regeneration = { factor.max = 0.02, rotation.mechanical = 300 , factor.min = 0 }
        """;

    public static TheoryData<string> Layouts => [Headers, Dots, Braces, Headers.ReplaceLineEndings("\r\n"), Braces + "\n# end", Presets.Text("plain-tank")];

    [Theory]
    [MemberData(nameof(Layouts))]
    public void A_save_of_what_was_read_changes_no_byte(string text) => Assert.Equal(text, StageText.Write(text, Read(text)));

    /// <summary>Values come, change and go in every combination a fixed sequence brings; each save reads back as the design.</summary>
    [Theory]
    [MemberData(nameof(Layouts))]
    public void Values_that_come_change_and_go_read_back(string text)
    {
        StageDesign first = Read(text);
        StageDesign design = first;
        string written = text;
        Field[] fields = [.. first.Family.Fields.Where(f => f.Kind is FieldKind.Quantity or FieldKind.Choice)];
        ulong state = 88172645463325252UL;
        for (int k = 0; k < 300; k++)
        {
            StageDesign next = design;
            for (int change = 0; change < 3; change++)
            {
                state ^= state << 13;   // xorshift64 [Marsaglia 2003]
                state ^= state >> 7;
                state ^= state << 17;
                Field field = fields[(int)(state % (ulong)fields.Length)];
                next = (state >> 40) % 3 == 0 && !field.Required
                    ? next with { Values = next.Values.Remove(field.Key) }
                    : next.With(field.Key, Any(field, next, (state >> 20) % 1000 / 1000.0, (state >> 50) % 4 == 0));
            }

            if (next.Family.Check(next).Count > 0)
            {
                continue;
            }

            written = StageText.Write(written, next);
            Same(next, Read(written));
            Assert.Equal(written, StageText.Write(written, next));
            design = next;
        }

        Assert.NotEqual(first.Values.Count, design.Values.Count);
        Same(first, Read(StageText.Write(written, first)));
    }

    [Fact]
    public void Braces_left_with_nothing_in_them_go_too()
    {
        string text = Presets.Text(Presets.Default);
        StageDesign design = Presets.Read(Presets.Default);
        string written = StageText.Write(
            text, design with { Values = design.Values.RemoveRange(["regeneration.series.value", "regeneration.series.at"]) });
        Assert.Equal(text.Replace("series = { value = \"220\", at = \"device\" }\n", "", StringComparison.Ordinal), written);
    }

    [Fact]
    public void A_value_goes_into_its_own_table_where_another_header_follows()
    {
        StageDesign design = Read(Headers);
        string written = StageText.Write(Headers, design.With("dial.trimmer", FieldValue.Of(8e-12)).With("regeneration.factor.min", FieldValue.Of(0.001)));
        Assert.Contains("high = \"1.7 MHz\"\ntrimmer = \"8p\"\n", written, StringComparison.Ordinal);
        Assert.Contains("max = 0.02\nmin = \"0.001\"\n", written, StringComparison.Ordinal);
    }

    [Fact]
    public void Notation_with_its_unit_spelled_out_stays_so()
    {
        string written = StageText.Write(Headers, Read(Headers).With("dial.low", FieldValue.Of(531e3)));
        Assert.Equal(Headers.Replace("530 kHz", "531 kHz", StringComparison.Ordinal), written);
    }

    [Fact]
    public void Parts_are_added_changed_and_taken_out_and_the_rest_keeps_its_bytes()
    {
        const string own = "\n[[part]]   # damps\nkind = \"resistor\"\nname = \"damper\"\nbetween = [\"tank top\", \"earth\"]\nvalue = \"470k\"\n";
        const string other = "\n[[part]]\nkind = \"capacitor\"\nname = \"shelf\"\nvalue = 1.0e-12\n[part.nodes]\n";
        string text = Presets.Text("plain-tank") + own;
        StageDesign design = Read(text);
        Resistor damper = Assert.IsType<Resistor>(Assert.Single(design.ExtraParts));
        Capacitor hand = new("hand \"near\" the coil", "tank top", Part.Earth, 0.3e-12);

        string added = StageText.Write(text, design with { ExtraParts = [damper, hand] });
        Assert.StartsWith(text, added, StringComparison.Ordinal);
        Assert.Equal([damper, hand], Read(added).ExtraParts);

        string changed = StageText.Write(added, design with { ExtraParts = [damper with { Ohm = 330e3 }, hand] });
        Assert.StartsWith(Presets.Text("plain-tank"), changed, StringComparison.Ordinal);
        Assert.Equal([damper with { Ohm = 330e3 }, hand], Read(changed).ExtraParts);

        Assert.Equal([hand, damper], Read(StageText.Write(added, design with { ExtraParts = [hand, damper] })).ExtraParts);
        Assert.Empty(Read(StageText.Write(changed, design with { ExtraParts = [] })).ExtraParts);
        Assert.NotEmpty(StageText.Read(text + other, "x", DeviceShelf.Shipped).Faults);
    }

    [Fact]
    public void Another_output_node_is_written_into_a_circuit_of_parts()
    {
        string text = PartsText.Write(Presets.Read(Presets.Default));
        StageDesign design = Read(text) with { OutputNode = "collector" };
        string written = StageText.Write(text, design);
        Assert.Equal(text.Replace("node = \"output\"", "node = \"collector\"", StringComparison.Ordinal), written);
    }

    [Fact]
    public void A_socket_takes_the_device_that_is_in_it()
    {
        string text = Presets.Text("tapped-coil-follower-off");
        StageDesign design = Presets.Read("tapped-coil-follower-off");
        StageDesign other = design with { Devices = design.Devices.SetItem("devices.main", DeviceShelf.Shipped.Find("BC557B")!.Model!) };
        string written = StageText.Write(text, other);
        Assert.Contains("main = \"BC557B\"", written, StringComparison.Ordinal);
        Assert.Equal(text.Split('\n').Length, written.Split('\n').Length);
    }

    [Fact]
    public void A_text_with_faults_or_of_another_family_is_refused()
    {
        StageDesign design = Presets.Read(Presets.Default);
        Assert.Throws<ArgumentException>(() => StageText.Write("format = 3", design));
        Assert.Throws<ArgumentException>(() => StageText.Write(Presets.Text("plain-tank"), design));
    }

    private static FieldValue Any(Field field, StageDesign design, double share, bool toleranced)
    {
        if (field.Kind == FieldKind.Choice)
        {
            return FieldValue.Of(field.Choices[(int)(share * field.Choices.Count)]);
        }

        double number = (design.NumberOrNull(field.Key) ?? ((field.Minimum + field.Maximum) / 2)) * (0.9 + (0.2 * share));
        return new FieldValue(Math.Clamp(number, field.Minimum, field.Maximum), null, toleranced ? Math.Round(share * 20, 1) : null);
    }

    private static StageDesign Read(string text)
    {
        StageReadResult result = StageText.Read(text, "stage.toml", DeviceShelf.Shipped);
        Assert.True(result.Design is not null, string.Join('\n', result.Faults) + "\n" + text);
        return result.Design;
    }

    private static void Same(StageDesign expected, StageDesign actual)
    {
        Assert.Equal(Shown(expected.Values), Shown(actual.Values));
        Assert.Equal(expected.Title, actual.Title);
        Assert.Equal(expected.Note, actual.Note);
    }

    private static string[] Shown(ImmutableSortedDictionary<string, FieldValue> values) =>
    [
        .. values.Select(v => string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{v.Key} {v.Value.Number:R} {v.Value.Text} {v.Value.TolerancePercent:R} {string.Join(';', v.Value.Pairs)}")),
    ];
}
