using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The stretches of the travel against single readings, which take another way to their regime.</summary>
public sealed class TravelRegimesTests
{
    private static readonly StageWorkspace _workspace = new(StageModel.Compile(DefaultStage.Design));

    public static TheoryData<double, DialMode> Places => new()
    {
        { 530e3, DialMode.Follows },
        { 1000e3, DialMode.Follows },
        { 1000e3, DialMode.Locked },
        { 1700e3, DialMode.Follows },
    };

    [Theory]
    [MemberData(nameof(Places))]
    public void Stretches_join_from_stop_to_stop_and_change_the_regime(double dialHz, DialMode mode)
    {
        IReadOnlyList<RegimeSpan> spans = TravelRegimes.Find(_workspace, new Setting(dialHz, 0) { DialMode = mode });
        Assert.Equal((0.0, 100.0), (spans[0].FromPercent, spans[^1].ToPercent));
        for (int k = 1; k < spans.Count; k++)
        {
            Assert.Equal(spans[k - 1].ToPercent, spans[k].FromPercent);
            Assert.NotEqual(spans[k - 1].Regime, spans[k].Regime);
        }
    }

    [Theory]
    [MemberData(nameof(Places))]
    public void Readings_within_a_stretch_are_of_its_regime(double dialHz, DialMode mode)
    {
        var setting = new Setting(dialHz, 0) { DialMode = mode };
        foreach (RegimeSpan span in TravelRegimes.Find(_workspace, setting))
        {
            double inside = Math.Min(0.01, (span.ToPercent - span.FromPercent) / 4);
            foreach (double travel in new[] { span.FromPercent + inside, (span.FromPercent + span.ToPercent) / 2, span.ToPercent - inside })
            {
                Assert.Equal(span.Regime, StageReader.Read(_workspace, setting with { TravelPercent = travel }, []).Regime);
            }
        }
    }

    [Theory]
    [MemberData(nameof(Places))]
    public void The_border_to_oscillation_is_the_tip_over(double dialHz, DialMode mode)
    {
        var setting = new Setting(dialHz, 0) { DialMode = mode };
        RegimeSpan oscillating = Assert.Single(TravelRegimes.Find(_workspace, setting), span => span.Regime == Regime.Oscillating);
        Assert.Equal(StageReader.Read(_workspace, setting, []).TipOver!.First!.Value.TravelPercent, oscillating.FromPercent, 1e-3);
    }

    [Fact]
    public void A_stage_far_from_regenerating_is_one_stretch()
    {
        // A large resistor in series with the control keeps the stage far from regenerating.
        var weak = new StageWorkspace(StageModel.Compile(DefaultStage.With("regeneration.series.value", 100e3)));
        RegimeSpan only = Assert.Single(TravelRegimes.Find(weak, new Setting(1e6, 0)));
        Assert.Equal((0.0, 100.0, StageReader.Read(weak, new Setting(1e6, 100), []).Regime!.Value), (only.FromPercent, only.ToPercent, only.Regime));
    }
}
