using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;

namespace RegenTrainer.Screens;

/// <summary>What all pages and panels of the screen share: the stage at hand and what it is compared with.</summary>
internal sealed class Bench
{
    private string _told = "";
    private string _heard = "";

    /// <summary>A bench with a stage that is looked at and turned, but not rebuilt.</summary>
    public Bench(LiveStage stage) => Stage = stage;

    /// <summary>A bench with a design that is worked on.</summary>
    public Bench(Workbench workbench)
        : this(workbench.Stage) => Workbench = workbench;

    /// <summary>The stage at hand.</summary>
    public LiveStage Stage { get; }

    /// <summary>The design it is built from and its file; null where it is only looked at.</summary>
    public Workbench? Workbench { get; }

    /// <summary>The stage or setting pinned for comparison; null where none is.</summary>
    public PinnedStage? Pinned { get; private set; }

    /// <summary>The stage as it was when the open panel opened; null where no panel changes it.</summary>
    public StageSnapshot? Before { get; set; }

    /// <summary>What the stage is compared with.</summary>
    public Compared Compared => new(Pinned?.Stage, Before);

    /// <summary>What the bench has to say beside the stage.</summary>
    public BenchWords Words => new(Workbench?.IsChanged == true, PinnedWords, Notice);

    private string Notice => _told.Length > 0 ? _told : Workbench?.Notice is { } lasting && lasting != _heard ? lasting : "";

    private string PinnedWords => Pinned is { Stage: var pinned }
        ? $"{pinned.Title} at {Figures.Fixed(pinned.Setting.TravelPercent, "0.##")} %, {Figures.Dial(pinned.Setting.DialHz)}"
        : "";

    /// <summary>Pins the stage as it is now, or lets go of what is pinned.</summary>
    public void TogglePin(int responsePoints) => Pinned = Pinned is null ? new PinnedStage(Stage.Snapshot(responsePoints), Stage.Solver) : null;

    /// <summary>Tells something until the next key.</summary>
    public void Tell(string words) => _told = words;

    /// <summary>Puts away what was told, and with <paramref name="lasting"/> what stays until it is put away too.</summary>
    public void PutAway(bool lasting) => (_told, _heard) = ("", lasting ? Workbench?.Notice ?? "" : _heard);

    /// <summary>Does what is due about once a turn of the screen.</summary>
    /// <returns>Whether there is something else to tell.</returns>
    public bool Tick()
    {
        string before = Notice;
        Workbench?.Tick();
        return Notice != before;
    }

    /// <summary>Takes the last change of the design back, or does it again, and tells which it was.</summary>
    public void Undo(bool redo)
    {
        if (Workbench is not { } workbench)
        {
            return;
        }

        StageDesign before = workbench.Design;
        bool done = redo ? workbench.Redo() : workbench.Undo();
        string verb = redo ? "redone" : "undone";
        Tell(done ? $"{verb}: {DesignChange.Words(before, workbench.Design)}" : redo ? "nothing to redo" : "nothing to undo");
    }
}
