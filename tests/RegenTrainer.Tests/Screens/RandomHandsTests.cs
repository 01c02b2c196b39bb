using RegenTrainer.Core.Stages;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class RandomHandsTests
{
    // A property: whatever is pressed, clicked, typed or resized, no frame is beyond the width, nothing throws, memory stays flat.
    [Fact]
    public void A_hundred_thousand_random_events_leave_every_frame_within_the_width()
    {
        using var hands = new RandomHands(new Bench(new LiveStage(new MadeUpStage((60, true)), new Setting(1e6, 40))), seed: 20261201);
        hands.Run(events: 100_000, eventsPerFrame: 100);
        Assert.Equal(1000, hands.Frames);
        Assert.True(hands.GrowthBytes < 8 << 20, $"{hands.GrowthBytes} bytes more");
    }

    [Fact]
    public void A_design_that_is_worked_on_stands_random_hands()
    {
        using var stage = new WorkedStage(preset: true);
        using var hands = new RandomHands(stage.Bench, seed: 7);
        hands.Run(events: 500, eventsPerFrame: 5);
        Assert.Equal(100, hands.Frames);
    }
}
