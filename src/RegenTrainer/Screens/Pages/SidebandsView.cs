using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Pages;

/// <summary>Page 3: the programme's sidebands.</summary>
internal sealed class SidebandsView(Bench bench) : IPage
{
    private const int Points = 60;

    private static readonly double[] _audioHz =
    [
        .. Enumerable.Range(0, Points).Select(k =>
            SidebandsPage.LowestHz * Math.Pow(SidebandsPage.HighestHz / SidebandsPage.LowestHz, k / (double)(Points - 1))),
    ];

    private (IStageSolver Solver, Setting Setting, IReadOnlyList<Sideband> Curve, Interaction Interaction)? _now;
    private (PinnedStage Pinned, IReadOnlyList<Sideband> Curve)? _pinned;

    /// <inheritdoc/>
    public char Digit => '3';

    /// <inheritdoc/>
    public string Name => "Sidebands";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => [];

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        (IReadOnlyList<Sideband> curve, Interaction interaction) = Now(stage);
        SidebandsPage.Draw(canvas, region, stage, new SidebandsPicture(curve, OfPinned(), interaction));
    }

    /// <inheritdoc/>
    public bool Press(Key key) => false;

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row) => false;

    /// <inheritdoc/>
    public bool Poll() => false;

    private (IReadOnlyList<Sideband> Curve, Interaction Interaction) Now(StageSnapshot stage)
    {
        IStageSolver solver = bench.Stage.Solver;
        if (_now is not { } now || now.Solver != solver || now.Setting != stage.Setting)
        {
            _now = now = (solver, stage.Setting, solver.Sidebands(stage.Setting, _audioHz), solver.Interaction(stage.Setting));
        }

        return (now.Curve, now.Interaction);
    }

    private IReadOnlyList<Sideband> OfPinned()
    {
        if (bench.Pinned is not { } pinned)
        {
            return [];
        }

        if (_pinned is not { } known || known.Pinned != pinned)
        {
            _pinned = known = (pinned, pinned.Solver.Sidebands(pinned.Stage.Setting, _audioHz));
        }

        return known.Curve;
    }
}
