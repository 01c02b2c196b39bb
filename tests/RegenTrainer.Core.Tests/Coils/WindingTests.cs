using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class WindingTests
{
    private static readonly Wire _wire = new(0.4e-3);

    [Fact]
    public void Radius_runs_to_the_middle_of_the_wire()
    {
        Winding winding = Winding.OnForm(0.05, new Wire(0.4e-3, 0.44e-3), 90);
        Assert.Equal(25.22e-3, winding.RadiusMetre, 1e-12);
        Assert.Equal(0.44e-3, winding.PitchMetre, 1e-12);
    }

    // Enamel a tenth of the wire thick in diameter, from memory.
    [Fact]
    public void Insulation_left_out_is_a_tenth_of_the_wire() => Assert.Equal(0.44e-3, _wire.OverInsulationMetre, 1e-12);

    [Fact]
    public void Turns_closer_than_their_wire_are_refused()
    {
        ArgumentOutOfRangeException refused =
            Assert.Throws<ArgumentOutOfRangeException>(() => Winding.OnForm(0.05, _wire, 90, 0.43e-3));
        Assert.Contains("pitchMetre is 0.00043", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-3)]
    [InlineData(90)]
    [InlineData(120)]
    public void Tap_at_an_end_or_beyond_is_refused(int tap)
    {
        ArgumentOutOfRangeException refused =
            Assert.Throws<ArgumentOutOfRangeException>(() => Winding.OnForm(0.05, _wire, 90, tapTurns: [tap]));
        Assert.Contains($"Tap {tap} of a winding of 90 turns", refused.Message, StringComparison.Ordinal);
        Assert.Contains("from 1 to 89", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(24, 4)]
    [InlineData(24, 24)]
    public void Taps_out_of_order_are_refused(int first, int second)
    {
        ArgumentException refused =
            Assert.Throws<ArgumentException>(() => Winding.OnForm(0.05, _wire, 90, tapTurns: [first, second]));
        Assert.Contains($"Tap {second} follows tap {first}", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Limits_hold()
    {
        Assert.Equal(65, Winding.OnForm(0.05, _wire, 5000, tapTurns: [.. Enumerable.Range(1, 64)]).SectionCount);
        Assert.Throws<ArgumentException>(() => Winding.OnForm(0.05, _wire, 5000, tapTurns: [.. Enumerable.Range(1, 65)]));
        Assert.Throws<ArgumentOutOfRangeException>(() => Winding.OnForm(0.05, _wire, 5001));
        Assert.Throws<ArgumentOutOfRangeException>(() => Winding.OnForm(0.05, _wire, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Winding.OnForm(double.NaN, _wire, 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Wire(0.4e-3, 0.3e-3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Wire(0.0));
    }

    [Fact]
    public void Sections_lie_between_the_taps()
    {
        Winding winding = Winding.OnForm(0.05, _wire, 84, tapTurns: [4, 24]);
        Assert.Equal([0, 4, 24, 84], Enumerable.Range(0, 4).Select(winding.FirstTurn));
        Assert.Throws<ArgumentOutOfRangeException>(() => winding.FirstTurn(4));
    }

    [Fact]
    public void Taps_count_in_equality_and_are_the_winding_s_own()
    {
        int[] taps = [4, 24];
        Winding winding = Winding.OnForm(0.05, _wire, 84, tapTurns: taps);
        taps[0] = 9;
        Assert.Equal(4, winding.TapTurns[0]);
        Assert.Equal(winding, Winding.OnForm(0.05, _wire, 84, tapTurns: [4, 24]));
        Assert.Equal(winding.GetHashCode(), Winding.OnForm(0.05, _wire, 84, tapTurns: [4, 24]).GetHashCode());
        Assert.NotEqual(winding, Winding.OnForm(0.05, _wire, 84, tapTurns: [4, 25]));
    }
}
