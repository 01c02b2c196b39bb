using RegenTrainer.Drawing;
using RegenTrainer.Session;

namespace RegenTrainer.Screens;

/// <summary>What all pages and panels of the screen share: the stage at hand and what it is compared with.</summary>
internal sealed class Bench(LiveStage stage)
{
    /// <summary>The stage at hand.</summary>
    public LiveStage Stage { get; } = stage;

    /// <summary>The stage or setting pinned for comparison; null where none is.</summary>
    public PinnedStage? Pinned { get; private set; }

    /// <summary>The stage as it was when the open panel opened; null where no panel changes it.</summary>
    public StageSnapshot? Before { get; set; }

    /// <summary>What the stage is compared with.</summary>
    public Compared Compared => new(Pinned?.Stage, Before);

    /// <summary>What the bench has to say beside the stage.</summary>
    public BenchWords Words => new(Changed: false, PinnedWords, "");

    private string PinnedWords => Pinned is { Stage: var pinned }
        ? $"{pinned.Title} at {Figures.Fixed(pinned.Setting.TravelPercent, "0.##")} %, {Figures.Dial(pinned.Setting.DialHz)}"
        : "";

    /// <summary>Pins the stage as it is now, or lets go of what is pinned.</summary>
    public void TogglePin(int responsePoints) => Pinned = Pinned is null ? new PinnedStage(Stage.Snapshot(responsePoints), Stage.Solver) : null;
}
