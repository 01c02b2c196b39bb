using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>The designs before and behind the present one.</summary>
/// <param name="present">The first design.</param>
internal sealed class DesignHistory(StageDesign present)
{
    /// <summary>So many steps can be taken back.</summary>
    public const int MostSteps = 200;

    private readonly LinkedList<StageDesign> _before = new();
    private readonly Stack<StageDesign> _behind = new();

    public StageDesign Present { get; private set; } = present;

    public int UndoCount => _before.Count;

    public int RedoCount => _behind.Count;

    /// <summary>Takes a step; what was undone before it is gone.</summary>
    public void Step(StageDesign next)
    {
        _before.AddLast(Present);
        if (_before.Count > MostSteps)
        {
            _before.RemoveFirst();
        }

        _behind.Clear();
        Present = next;
    }

    public bool TryUndo()
    {
        if (_before.Last is not { } last)
        {
            return false;
        }

        _before.RemoveLast();
        _behind.Push(Present);
        Present = last.Value;
        return true;
    }

    public bool TryRedo()
    {
        if (!_behind.TryPop(out StageDesign? next))
        {
            return false;
        }

        _before.AddLast(Present);
        Present = next;
        return true;
    }
}
