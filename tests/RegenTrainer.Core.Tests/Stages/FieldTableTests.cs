using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class FieldTableTests
{
    public static TheoryData<string> FamilyNames { get; } = [.. FamilyList.All.Select(f => f.Name)];

    [Fact]
    public void The_families_are_found_by_the_word_in_the_file()
    {
        Assert.Equal(["tapped-coil", "plain-tank", "parts"], FamilyList.All.Select(f => f.Name));
        Assert.Same(TappedCoil.Instance, FamilyList.ByName("tapped-coil"));
        Assert.Null(FamilyList.ByName("Tapped-Coil"));
    }

    [Theory]
    [MemberData(nameof(FamilyNames))]
    public void Keys_are_unique_and_no_key_is_also_a_table(string name)
    {
        Family family = FamilyList.ByName(name)!;
        List<string> keys = [.. family.Fields.Select(f => f.Key)];
        Assert.Equal(keys.Count, keys.Distinct().Count());
        Assert.All(keys, k => Assert.DoesNotContain(keys, other => other.StartsWith(k + ".", StringComparison.Ordinal)));
        Assert.All(keys, k => Assert.Matches("^[a-z_]+([.][a-z_]+)+$", k));
        Assert.All(family.Fields, f => Assert.Same(f, family.FieldFor(f.Key)));
    }

    [Theory]
    [MemberData(nameof(FamilyNames))]
    public void Defaults_are_values_a_builder_might_have_given(string name)
    {
        foreach (Field field in FamilyList.ByName(name)!.Fields)
        {
            Assert.NotEmpty(field.Meaning);
            Assert.True(field.Minimum <= field.Maximum, field.Key);
            if (field.Default is { } number)
            {
                Assert.True(field.Kind is FieldKind.Quantity or FieldKind.Count, field.Key);
                Assert.InRange(number, field.Minimum, field.Maximum);
            }

            if (field.Kind == FieldKind.Choice)
            {
                Assert.Contains(field.DefaultText, field.Choices);
            }
            else
            {
                Assert.Null(field.DefaultText);
                Assert.Empty(field.Choices);
            }

            Assert.False(field.Required && field.Default is not null, $"{field.Key} is required and yet has a default");
            Assert.True(field.Kind == FieldKind.Quantity || field.Unit == Unit.None, field.Key);
        }
    }

    [Fact]
    public void Every_value_of_the_default_stage_is_within_its_field()
    {
        Assert.All(DefaultStage.Design.Values, pair =>
        {
            Field? field = TappedCoil.Instance.FieldFor(pair.Key);
            Assert.NotNull(field);
            if (pair.Value.Number is { } number)
            {
                Assert.InRange(number, field.Minimum, field.Maximum);
            }
            else if (field.Kind == FieldKind.Choice)
            {
                Assert.Contains(pair.Value.Text, field.Choices);
            }
        });
    }

    /// <summary>
    /// Every value that is not required can be left out alone, the field's default or nothing in its place; but for the ends of
    /// the tuning capacitor, which only a table can stand for.
    /// </summary>
    [Fact]
    public void Any_optional_value_can_be_left_out()
    {
        foreach (Field field in TappedCoil.Instance.Fields.Where(f => !f.Required && f.Kind != FieldKind.Device && !IsEnd(f.Key)))
        {
            StageDesign design = DefaultStage.Without(field.Key);
            Assert.Empty(TappedCoil.Instance.Check(design));
            Assert.NotEmpty(TappedCoil.Instance.Expand(design).Parts);
        }
    }

    [Fact]
    public void A_stage_of_required_values_alone_can_be_built()
    {
        StageDesign full = DefaultStage.Design;
        StageDesign design = full with
        {
            Values = full.Values.RemoveRange(full.Values.Keys.Where(k => !full.Family.FieldFor(k)!.Required && !IsEnd(k))),
        };
        Assert.Empty(TappedCoil.Instance.Check(design));
        Assert.NotEmpty(TappedCoil.Instance.Expand(design).Parts);
    }

    [Fact]
    public void Every_kind_of_part_has_a_default_tolerance()
    {
        foreach (ToleranceKind kind in Enum.GetValues<ToleranceKind>().Where(k => k != ToleranceKind.None))
        {
            string? key = ToleranceFields.KeyFor(kind);
            Assert.NotNull(key);
            Assert.NotNull(TappedCoil.Instance.FieldFor(key)?.Default);
        }

        Assert.Null(ToleranceFields.KeyFor(ToleranceKind.None));
    }

    private static bool IsEnd(string key) => key is "dial.capacitor.min" or "dial.capacitor.max";
}
