using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class PlainTankTests
{
    [Fact]
    public void The_tank_is_wired_as_drawn()
    {
        Assert.Empty(PlainStage.Design.Family.Check(PlainStage.Design));
        StageCircuit circuit = Expand(PlainStage.Design);
        string[] drawn =
        [
            "tuning capacitor: tank top, earth",
            "tank wiring: tank top, earth",
            "tank coil: tank top, earth",
            "feedback: tank top, earth, earth, tank top",
            "antenna: antenna EMF, earth",
            "earth resistance: antenna EMF, antenna wire",
            "antenna capacitance: antenna wire, antenna",
            "antenna coupling: antenna, tank top",
            "output coupling: tank top, output",
            "load: output, earth",
            "load capacitance: output, earth",
        ];
        Assert.Equal(drawn, circuit.Parts.Select(p => $"{p.Name}: {string.Join(", ", p.Nodes)}"));
        Assert.Null(circuit.SupplyVolt);
        Assert.Equal("output", circuit.OutputNode);
    }

    /// <summary>Feedback undamps only when its current flows into the node whose voltage it follows.</summary>
    [Fact]
    public void The_feedback_drives_the_tank_in_phase()
    {
        StageCircuit circuit = Expand(PlainStage.Design);
        Feedback feedback = Assert.Single(circuit.Parts.OfType<Feedback>());
        Assert.Equal((feedback.SenseFrom, feedback.SenseTo), (feedback.OutTo, feedback.OutFrom));
        Assert.True(feedback.Siemens > 0);
        Assert.Equal(PartRole.Regeneration, feedback.Role);
        Assert.Equal(0, feedback.Factor);
        Assert.Equal(Unit.None, circuit.Control!.Unit);
    }

    /// <summary>
    /// The defaults reach from damped to oscillating on the whole band: at resonance an inductance of Q has the parallel
    /// conductance 1/(w L Q) (any textbook), which the feedback must exceed at full travel with some to spare.
    /// </summary>
    [Theory]
    [InlineData(530e3, 12.01e-6)]
    [InlineData(1700e3, 3.745e-6)]
    public void The_defaults_tip_over_within_the_travel(double hz, double lossSiemens)
    {
        StageDesign design = PlainStage.Design;
        double full = design.Number("feedback.transconductance") * design.Number("regeneration.factor.max");
        Assert.Equal(lossSiemens, 1 / (2 * Math.PI * hz * design.Number("tank.inductance") * design.Number("tank.q")), 0.01e-6);
        Assert.InRange(full, 1.3 * lossSiemens, 20 * lossSiemens);
    }

    [Fact]
    public void A_factor_upside_down_is_a_fault()
    {
        StageDesign design = PlainStage.Design.With("regeneration.factor.min", FieldValue.Of(0.05));
        FieldFault fault = Assert.Single(design.Family.Check(design));
        Assert.Equal(new FieldFault("regeneration.factor.min", "0.05", "less than 0.03, the factor at full travel"), fault);
    }

    private static StageCircuit Expand(StageDesign design) => design.Family.Expand(design);
}
