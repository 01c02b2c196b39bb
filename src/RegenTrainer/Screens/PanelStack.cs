using RegenTrainer.Screens.Panels;

namespace RegenTrainer.Screens;

/// <summary>The panels that are open, one above the other; the topmost is seen.</summary>
internal sealed class PanelStack
{
    private readonly List<IPanel> _open = [];

    /// <summary>The topmost; null where none is open.</summary>
    public IPanel? Top => _open.Count > 0 ? _open[^1] : null;

    /// <summary>Opens a panel above the others.</summary>
    public void Open(IPanel panel) => _open.Add(panel);

    /// <summary>Closes what is open inside of the topmost panel, or that panel.</summary>
    /// <returns>Whether there was one.</returns>
    public bool StepBack()
    {
        if (Top is not { } top)
        {
            return false;
        }

        if (!top.StepBack())
        {
            Close(top);
        }

        return true;
    }

    /// <summary>Closes the panels that have done their work, wherever they lie.</summary>
    public void CloseDone() => CloseWhere(panel => panel.IsDone);

    /// <summary>Closes them all.</summary>
    public void CloseAll() => CloseWhere(_ => true);

    /// <summary>Closes one panel.</summary>
    public void Close(IPanel panel) => CloseWhere(other => other == panel);

    private void CloseWhere(Func<IPanel, bool> closes)
    {
        for (int k = _open.Count - 1; k >= 0; k--)
        {
            if (closes(_open[k]))
            {
                IPanel panel = _open[k];
                _open.RemoveAt(k);
                panel.Close();
            }
        }
    }
}
