using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Core.Tests.Readings;

public sealed class CoilReaderTests
{
    private static readonly Wire _wire = new(0.4e-3);

    // pi 50.4 mm a turn and the helix's rise: 84 sqrt((pi 0.0504)² + 0.0006²) = 13.3109 m by the theorem of Pythagoras.
    [Fact]
    public void A_tapped_winding_reads_as_the_sum_of_its_sections()
    {
        CoilReading reading = CoilReader.Read("coil", new Coil(Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24])), 1e6, 20);
        WindingReading winding = Assert.Single(reading.Windings);
        Assert.Equal(3, reading.MatrixHenry.Count);
        Assert.Equal(winding.InductanceHenry, reading.MatrixHenry.Sum(row => row.Sum()), 1e-15);
        Assert.Equal(reading.MatrixHenry[0][2], reading.MatrixHenry[2][0]);
        Assert.Equal(84, winding.Turns);
        Assert.Equal(13.3109, winding.WireLengthMetre!.Value, 1e-3);
        Assert.Equal(2 * Math.PI * 1e6 * winding.InductanceHenry / winding.ResistanceOhm, winding.Q!.Value, 1e-9);
    }

    // Taps change no figure of the whole: the same wire on the same form.
    [Fact]
    public void Taps_leave_the_whole_winding_as_it_was()
    {
        WindingReading plain = CoilReader.Read("a", new Coil(Winding.OnForm(0.05, _wire, 84, 0.6e-3)), 1e6, 20).Windings[0];
        WindingReading tapped = CoilReader.Read("a", new Coil(Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24])), 1e6, 20).Windings[0];
        Assert.Equal(plain.InductanceHenry, tapped.InductanceHenry, 1e-12 * plain.InductanceHenry);
        Assert.Equal(plain.ResistanceOhm, tapped.ResistanceOhm, 1e-9 * plain.ResistanceOhm);
    }

    // 200 uH at 1 MHz has 1256.637 ohm; a Q of 100 is 12.56637 ohm, and 2 ohm in series leave a Q of 86.27: Ohm's law.
    [Fact]
    public void Lone_inductors_read_by_their_stated_loss_and_join_the_coils_of_a_stage()
    {
        Part[] parts =
        [
            new Inductor("first", "a", "0", 200e-6, 2, 100),
            new Resistor("between", "a", "0", 1e3),
            new Inductor("second", "b", "0", 10e-6),
        ];
        CoilReading reading = CoilReader.TryRead(parts, 1e6, 20)!;
        Assert.Equal(["first", "second"], reading.Windings.Select(w => w.Name));
        Assert.Equal(14.56637, reading.Windings[0].ResistanceOhm, 1e-5);
        Assert.Equal(86.27, reading.Windings[0].Q!.Value, 1e-2);
        Assert.Null(reading.Windings[0].Turns);
        Assert.Null(reading.Windings[1].Q);
        Assert.Null(CoilReader.TryRead([parts[1]], 1e6, 20));
    }

    [Theory]
    [InlineData(0, 20)]
    [InlineData(double.NaN, 20)]
    [InlineData(1e6, -101)]
    [InlineData(1e6, 201)]
    public void Frequencies_and_temperatures_out_of_range_are_refused(double hz, double celsius) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => CoilReader.Read("coil", new Coil(Winding.OnForm(0.05, _wire, 84, 0.6e-3)), hz, celsius));
}
