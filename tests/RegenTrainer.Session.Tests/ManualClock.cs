namespace RegenTrainer.Session.Tests;

/// <summary>A clock that goes when it is told to.</summary>
internal sealed class ManualClock : TimeProvider
{
    private TimeSpan _gone;

    public static DateTimeOffset Start { get; } = new(2024, 3, 1, 12, 0, 0, TimeSpan.Zero);

    public override long TimestampFrequency => TimeSpan.TicksPerSecond;

    public void Go(double seconds) => _gone += TimeSpan.FromSeconds(seconds);

    public override DateTimeOffset GetUtcNow() => Start + _gone;

    public override long GetTimestamp() => _gone.Ticks;
}
