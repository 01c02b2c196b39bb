using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>What a stage is shown beside.</summary>
/// <param name="Pinned">The stage or setting pinned: its curve stays, dotted, and read-outs show the difference to it.</param>
/// <param name="Before">The stage before the changes going on: its curve stays, dotted.</param>
internal readonly record struct Compared(StageSnapshot? Pinned, StageSnapshot? Before)
{
    /// <summary>Compared with nothing.</summary>
    public static readonly Compared None;

    /// <summary>The curves to draw beneath the stage's own, with their inks.</summary>
    public IEnumerable<(StageSnapshot Stage, Ink Ink)> Earlier
    {
        get
        {
            if (Before is { } before)
            {
                yield return (before, Ink.Label);
            }

            if (Pinned is { } pinned)
            {
                yield return (pinned, Ink.Pinned);
            }
        }
    }
}
