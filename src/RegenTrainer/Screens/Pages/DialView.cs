using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Pages;

/// <summary>Page 2: along the whole dial.</summary>
internal sealed class DialView(Bench bench) : IPage, IDisposable
{
    private const int PageSteps = 10;

    private readonly LatestRequest<StageRequest, DialCurves> _sweep = new((request, _) => DialSweep.Run(request), cutShort: false);
    private readonly LatestRequest<StageRequest, DialCurves> _pinnedSweep = new((request, _) => DialSweep.Run(request), cutShort: false);
    private int _quantity;
    private int? _cursor;

    /// <inheritdoc/>
    public char Digit => '2';

    /// <inheritdoc/>
    public string Name => "Dial";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys =>
        [("Up Down", "cursor; Page: by ten"), ("Enter", "dial to the cursor"), ("Tab", "next figure")];

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        _sweep.Ask(DialSweep.Request(bench.Stage.Solver, stage.Setting));
        if (bench.Pinned is { } pinned)
        {
            _pinnedSweep.Ask(DialSweep.Request(pinned.Solver, pinned.Stage.Setting));
        }

        DialPage.Draw(canvas, region, stage, Picture());
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        if (key == Key.Tab || key == Key.Tab.WithShift)
        {
            int count = DialQuantity.All.Count;
            _quantity = (_quantity + (key.IsShift ? count - 1 : 1)) % count;
            return true;
        }

        if (_sweep.Latest?.Result is not { } curves)
        {
            return false;
        }

        if (key == Key.Enter)
        {
            double hz = curves.Curves[0].Points[Cursor(curves)].DialHz;
            bench.Stage.TurnDialBy(hz - bench.Stage.Setting.DialHz);
            return true;
        }

        int step = key == Key.CursorUp ? 1 : key == Key.CursorDown ? -1 : key == Key.PageUp ? PageSteps : key == Key.PageDown ? -PageSteps : 0;
        _cursor = step == 0 ? _cursor : Math.Clamp(Cursor(curves) + step, 0, curves.Curves[0].Points.Count - 1);
        return step != 0;
    }

    /// <summary>A click puts the cursor there; one on the cursor sets the dial.</summary>
    public bool Click(Region region, int column, int row)
    {
        int point = DialPage.PointAt(region, Picture(), column, row);
        if (point >= 0 && point == _cursor)
        {
            return Press(Key.Enter);
        }

        _cursor = point >= 0 ? point : _cursor;
        return point >= 0;
    }

    /// <inheritdoc/>
    public bool Poll() => _sweep.Poll() | _pinnedSweep.Poll();

    /// <inheritdoc/>
    public void Dispose()
    {
        _sweep.Dispose();
        _pinnedSweep.Dispose();
    }

    private DialPicture Picture()
    {
        DialCurves? curves = _sweep.Latest?.Result;
        return new DialPicture(
            curves, _sweep.IsWorking, bench.Pinned is null ? null : _pinnedSweep.Latest?.Result, _quantity, curves is null ? 0 : Cursor(curves));
    }

    /// <summary>The point under the cursor; the nearest to the dial until it is moved.</summary>
    private int Cursor(DialCurves curves)
    {
        var points = curves.Curves[0].Points;
        return _cursor is { } at
            ? Math.Min(at, points.Count - 1)
            : Enumerable.Range(0, points.Count).MinBy(k => Math.Abs(points[k].DialHz - bench.Stage.Setting.DialHz));
    }
}
