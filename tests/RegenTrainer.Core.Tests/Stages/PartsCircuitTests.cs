using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class PartsCircuitTests
{
    private static readonly Inductor _coil = new("coil", "top", Part.Earth, 250e-6, Q: 100);
    private static readonly Capacitor _tuning = new("tuning", "top", Part.Earth, 365e-12) { Role = PartRole.Tuning };
    private static readonly Resistor _control = new("control", "top", Part.Earth, 10e3) { Role = PartRole.Regeneration };
    private static readonly Feedback _feedback =
        new("feedback", "top", Part.Earth, Part.Earth, "top", 1e-3, 0) { Role = PartRole.Regeneration };

    [Fact]
    public void A_tank_alone_is_a_stage_without_a_control()
    {
        StageDesign design = Design("top", _coil, _tuning);
        Assert.Empty(design.Family.Check(design));
        StageCircuit circuit = design.Family.Expand(design);
        Assert.Null(circuit.Control);
        Assert.Null(circuit.SupplyVolt);
        Assert.Equal("top", circuit.OutputNode);
        Assert.Equal(design.ExtraParts, circuit.Parts);
    }

    /// <summary>The expansion of a stage, taken as parts, is the same stage.</summary>
    [Fact]
    public void The_parts_of_the_default_stage_make_the_same_stage()
    {
        StageCircuit circuit = DefaultStage.Design.Family.Expand(DefaultStage.Design);
        ImmutableSortedDictionary<string, FieldValue> values = DefaultStage.Design.Values;
        StageDesign parts = DefaultStage.Design with
        {
            Family = PartsCircuit.Instance,
            Values = values.RemoveRange(values.Keys.Where(k => PartsCircuit.Instance.FieldFor(k) is null)),
            ExtraParts = [.. circuit.Parts],
            OutputNode = circuit.OutputNode,
        };
        Assert.Empty(parts.Family.Check(parts));
        StageCircuit again = parts.Family.Expand(parts);
        Assert.Equal(circuit.Parts, again.Parts);
        Assert.Equal(circuit.OutputNode, again.OutputNode);
        Assert.Equal(circuit.SupplyVolt, again.SupplyVolt);
        Assert.Equal(circuit.Control!.Law.ValueAtStart, again.Control!.Law.ValueAtStart);
        Assert.Equal(circuit.Control.Unit, again.Control.Unit);
    }

    [Fact]
    public void A_control_resistor_takes_its_law_from_the_potentiometer()
    {
        StageDesign design = Design("top", _coil, _tuning, _control);
        Assert.Equal(("regeneration.potentiometer.total", "nothing"), Only(design));
        StageDesign whole = design.With("regeneration.potentiometer.total", FieldValue.Of(10e3));
        Assert.Empty(whole.Family.Check(whole));
        Assert.Equal(Unit.Ohm, whole.Family.Expand(whole).Control!.Unit);
    }

    [Fact]
    public void A_feedback_element_takes_its_law_from_the_factor()
    {
        StageDesign design = Design("top", _coil, _tuning, _feedback);
        Assert.Equal(("regeneration.factor.max", "nothing"), Only(design));
        StageDesign whole = design.With("regeneration.factor.max", FieldValue.Of(0.05));
        Assert.Empty(whole.Family.Check(whole));
        Assert.Equal(Unit.None, whole.Family.Expand(whole).Control!.Unit);
    }

    [Fact]
    public void A_missing_tuning_role_is_a_fault()
    {
        StageDesign design = Design("top", _coil, _tuning with { Role = PartRole.None });
        Assert.Equal(("part", "no part with the role \"tuning\""), Only(design));
    }

    [Fact]
    public void A_role_on_a_part_that_cannot_play_it_is_a_fault()
    {
        Assert.Equal(
            ("part:coil", "the role \"regenerating\" on an inductor"),
            Only(Design("top", _coil with { Role = PartRole.Regenerating }, _tuning)));
        Assert.Equal(
            ("part:coil", "the role \"regeneration\" on an inductor"),
            Only(Design("top", _coil with { Role = PartRole.Regeneration }, _tuning)));
        Assert.Equal(
            ("part:coil", "the role \"tuning\" on an inductor"),
            Only(Design("top", _coil with { Role = PartRole.Tuning }, _tuning with { Role = PartRole.None })));
    }

    [Theory]
    [InlineData(null, "nothing")]
    [InlineData("earth", "\"earth\"")]
    [InlineData("plate", "node \"plate\", which no part is connected to")]
    [InlineData("end", "node \"end\" at the end of a single part")]
    public void An_output_that_is_no_node_of_the_stage_is_a_fault(string? node, string found) =>
        Assert.Equal(("output.node", found), Only(Design(node, _coil, _tuning, new Resistor("lead", "top", "end", 1))));

    [Fact]
    public void A_node_that_only_feedback_drives_floats()
    {
        Feedback feedback = new("feedback", "top", Part.Earth, Part.Earth, "far", 1e-3, 1);
        Assert.Equal(
            ("part:feedback", "node \"far\", which no path through parts joins to earth"),
            Only(Design("top", _coil, _tuning, feedback)));
    }

    [Fact]
    public void A_winding_coupled_by_its_field_alone_floats()
    {
        Windings windings = (Windings)DefaultStage.Design.Family.Expand(DefaultStage.Design).Parts[0] with
        {
            SectionNodes = [("top", Part.Earth), ("link start", "link end"), ("link end", "link far")],
        };
        StageDesign design = Design("top", windings, _tuning);
        Assert.Equal(3, design.Family.Check(design).Count);
        StageDesign earthed = Design("top", windings, _tuning, new Resistor("link earth", "link far", Part.Earth, 1e6));
        Assert.Empty(earthed.Family.Check(earthed));
    }

    [Fact]
    public void More_parts_or_nodes_than_a_stage_may_have_are_a_fault()
    {
        IEnumerable<Part> Ladder(int count) => Enumerable.Range(0, count).Select(i => new Resistor($"r{i}", i == 0 ? "top" : $"n{i}", $"n{i + 1}", 1));
        IEnumerable<Part> Heap(int count) => Enumerable.Range(0, count).Select(i => new Resistor($"r{i}", "top", Part.Earth, 1));

        StageDesign most = Design("top", [_coil, _tuning, .. Ladder(199)]);
        Assert.Empty(most.Family.Check(most));
        Assert.Equal(("part:r199", "201 nodes"), Only(Design("top", [_coil, _tuning, .. Ladder(200)])));
        StageDesign full = Design("top", [_coil, _tuning, .. Heap(498)]);
        Assert.Empty(full.Family.Check(full));
        Assert.Equal(("part:r498", "501 parts"), Only(Design("top", [_coil, _tuning, .. Heap(499)])));
    }

    public static TheoryData<Part, string> Impossible { get; } = new()
    {
        { new Resistor("odd", "top", Part.Earth, 0), "0 \u03a9" },
        { new Resistor("odd", "top", Part.Earth, double.PositiveInfinity), "\u221e \u03a9" },
        { new Capacitor("odd", "top", Part.Earth, -1e-12), "-1 pF" },
        { new Capacitor("odd", "top", Part.Earth, 1e-12, 0), "0" },
        { new Inductor("odd", "top", Part.Earth, 0), "0 H" },
        { new Inductor("odd", "top", Part.Earth, 1e-6, -1), "-1 \u03a9" },
        { new Bead("odd", "top", Part.Earth, 100, 1e-6, -1e-12), "-1 pF" },
        { new Supply("odd", "top", Part.Earth, 3, -2), "-2 \u03a9" },
    };

    [Theory]
    [MemberData(nameof(Impossible))]
    public void A_part_with_an_impossible_figure_is_a_fault(Part part, string found) =>
        Assert.Equal(("part:odd", found), Only(Design("top", _coil, _tuning, part)));

    [Fact]
    public void Windings_need_nodes_for_every_section()
    {
        Windings windings = (Windings)DefaultStage.Design.Family.Expand(DefaultStage.Design).Parts[0] with
        {
            SectionNodes = [("top", Part.Earth)],
        };
        Assert.Equal(("part:coil", "nodes for 1 of the sections"), Only(Design("top", windings, _tuning)));
    }

    [Fact]
    public void The_nominal_supply_is_the_size_of_the_first()
    {
        StageDesign design = Design("top", _coil, _tuning, new Supply("battery", "rail", Part.Earth, -4.5, 1));
        Assert.Empty(design.Family.Check(design));
        Assert.Equal(4.5, design.Family.Expand(design).SupplyVolt);
    }

    private static (string Key, string Found) Only(StageDesign design)
    {
        FieldFault fault = Assert.Single(design.Family.Check(design));
        return (fault.Key, fault.Found);
    }

    private static StageDesign Design(string? output, params Part[] parts)
    {
        ImmutableSortedDictionary<string, FieldValue> values = PlainStage.Design.Values;
        return PlainStage.Design with
        {
            Family = PartsCircuit.Instance,
            Values = values.RemoveRange(values.Keys.Where(k => PartsCircuit.Instance.FieldFor(k) is null)),
            ExtraParts = [.. parts],
            OutputNode = output,
        };
    }
}
