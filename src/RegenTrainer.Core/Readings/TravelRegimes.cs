using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>A stretch of the control's travel on which the stage does one thing.</summary>
/// <param name="FromPercent">Where it begins, 0 to 100 % of travel.</param>
/// <param name="ToPercent">Where it ends, 0 to 100 % of travel.</param>
/// <param name="Regime">What the stage does there.</param>
public readonly record struct RegimeSpan(double FromPercent, double ToPercent, Regime Regime);

/// <summary>
/// What the stage does along the whole travel. Even steps find where the regime changes, halving finds the border; a stretch
/// shorter than a step between two of the same regime may be passed over, crossings of the threshold are
/// <see cref="TipOverSolver"/>'s.
/// </summary>
public static class TravelRegimes
{
    private const int Steps = 40;

    /// <summary>Borders are found to this many % of travel.</summary>
    private const double TolerancePercent = 1e-3;

    /// <summary>Finds the stretches in order of travel, without gaps from 0 to 100 %.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting; its travel does not count.</param>
    /// <returns>The stretches; empty where the stage has no control or a point of the travel cannot be solved.</returns>
    public static IReadOnlyList<RegimeSpan> Find(StageWorkspace ws, Setting setting)
    {
        if (ws.Model.ControlLaw is null)
        {
            return [];
        }

        var search = new Search(ws, setting);
        if (search.At(0) is not { } regime)
        {
            return [];
        }

        for (int k = 1; k <= Steps; k++)
        {
            double travel = 100.0 * k / Steps;
            if (search.At(travel) is not { } next || !search.Split(travel - (100.0 / Steps), regime, travel, next))
            {
                return [];
            }

            regime = next;
        }

        return search.Spans(regime);
    }

    private sealed class Search(StageWorkspace ws, Setting setting)
    {
        private readonly List<RegimeSpan> _spans = [];
        private TankHint _hint = TankHint.None;

        public Regime? At(double travelPercent)
        {
            Position position = Position.Solve(ws, setting with { TravelPercent = travelPercent }, _hint);
            _hint = TankHint.From(position.State);
            if (!position.State.Found)
            {
                return null;
            }

            double growth = TankFamily.FastestGrowing(ws, position.Query.DialHz, position.State).Real;
            if (growth > 0)
            {
                return Regime.Oscillating;
            }

            return Pull.QRemoved(ws, position) is { } qOff ? Margin.RegimeOf(growth, position.State.Mode.Q, qOff) : null;
        }

        /// <summary>Closes a stretch at every border between two places; false where a place cannot be solved.</summary>
        public bool Split(double from, Regime before, double to, Regime after)
        {
            if (before == after)
            {
                return true;
            }

            double middle = (from + to) / 2;
            if (to - from <= TolerancePercent)
            {
                _spans.Add(new RegimeSpan(End, middle, before));
                return true;
            }

            return At(middle) is { } between && Split(from, before, middle, between) && Split(middle, between, to, after);
        }

        public IReadOnlyList<RegimeSpan> Spans(Regime last) => [.. _spans, new RegimeSpan(End, 100, last)];

        private double End => _spans.Count == 0 ? 0 : _spans[^1].ToPercent;
    }
}
