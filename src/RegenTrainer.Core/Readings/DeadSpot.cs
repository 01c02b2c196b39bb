namespace RegenTrainer.Core.Readings;

/// <summary>Why regeneration is of no use at a place of the dial.</summary>
public enum DeadSpotReason
{
    /// <summary>The tuning capacitor does not reach it.</summary>
    OutOfReach,

    /// <summary>The stage oscillates at every travel.</summary>
    AlwaysOscillates,

    /// <summary>The stage oscillates at the idle stop and more travel only stops it.</summary>
    OscillatesAtIdle,

    /// <summary>It would tip over, but only with the control beyond its end: a hundredth of its last resistance, or a hundred times its last factor.</summary>
    TipsOverBeyondTravel,

    /// <summary>It would not tip over there either.</summary>
    NeverTipsOver,

    /// <summary>Operating point, tank or tip-over could not be solved.</summary>
    Unsolved,
}

/// <summary>A stretch of the dial on which regeneration is of no use.</summary>
/// <param name="FromHz">Its lowest dial point in Hz.</param>
/// <param name="ToHz">Its highest dial point in Hz.</param>
/// <param name="Reason">Why.</param>
public readonly record struct DeadSpot(double FromHz, double ToHz, DeadSpotReason Reason)
{
    /// <summary>The dead spots among dial points: neighbours of one reason are one spot.</summary>
    /// <param name="points">The points in the order of the dial.</param>
    public static IReadOnlyList<DeadSpot> Along(IReadOnlyList<DialPoint> points)
    {
        var spots = new List<DeadSpot>();
        DeadSpotReason? before = null;
        foreach (DialPoint point in points)
        {
            if (point.Dead is { } reason)
            {
                if (reason == before)
                {
                    spots[^1] = spots[^1] with { ToHz = point.DialHz };
                }
                else
                {
                    spots.Add(new DeadSpot(point.DialHz, point.DialHz, reason));
                }
            }

            before = point.Dead;
        }

        return spots;
    }
}
