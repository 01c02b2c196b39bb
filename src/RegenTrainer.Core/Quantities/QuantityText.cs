namespace RegenTrainer.Core.Quantities;

/// <summary>
/// Reads and writes quantities as the trade writes them: the letter code of IEC 60062 (<c>4k7</c>, <c>R47</c>, <c>100n</c>),
/// SI numbers with prefix and sign (<c>0.4 mm</c>, <c>530 kHz</c>, <c>1e-9</c>), and for lengths <c>AWG 26</c> (ASTM B258).
/// The point is the decimal sign whatever the culture; <c>M</c> is mega and <c>m</c> milli; a number without letters is in the
/// unit itself.
/// </summary>
public static class QuantityText
{
    /// <summary>Reads a quantity; blanks around it do not count.</summary>
    /// <param name="text">What was typed.</param>
    /// <param name="unit">What it must measure.</param>
    /// <param name="value">The value in that unit, finite; 0 on a fault.</param>
    /// <param name="fault">Where and why it cannot be read; empty on success.</param>
    /// <returns>Whether it could be read.</returns>
    public static bool TryRead(string text, Unit unit, out double value, out QuantityFault fault)
    {
        ArgumentNullException.ThrowIfNull(text);
        QuantityReader reader = new(new TypedText(text), unit);
        bool read = reader.TryRead(out value);
        fault = read ? default : reader.Fault;
        return read;
    }

    /// <summary>Reads a quantity or says why not.</summary>
    /// <exception cref="FormatException">The text cannot be read; the message says where, what was found and what is expected.</exception>
    public static double Read(string text, Unit unit) =>
        TryRead(text, unit, out double value, out QuantityFault fault)
            ? value
            : throw new FormatException($"At character {fault.Offset + 1}: {fault.Message}.");

    /// <summary>Reads a tolerance in percent: <c>5%</c>, <c>5</c>, or a letter of IEC 60062 such as <c>J</c>.</summary>
    /// <param name="text">What was typed.</param>
    /// <param name="percent">The tolerance to either side in percent, 0 to 100.</param>
    /// <param name="fault">Where and why it cannot be read; empty on success.</param>
    /// <returns>Whether it could be read.</returns>
    public static bool TryReadTolerance(string text, out double percent, out QuantityFault fault)
    {
        ArgumentNullException.ThrowIfNull(text);
        string trimmed = text.Trim();
        fault = default;
        if (trimmed.Length == 1 && TolerancePercent(trimmed[0]) is double lettered)
        {
            percent = lettered;
            return true;
        }

        // A tolerance is to either side, so the sign for that may stand before it; a blank keeps the offsets.
        int start = text.Length - text.TrimStart().Length;
        string unsigned = trimmed.StartsWith('\u00b1') ? text.Remove(start, 1).Insert(start, " ") : text;
        if (!TryRead(unsigned, Unit.Percent, out percent, out fault))
        {
            return false;
        }

        if (percent is >= 0.0 and <= 100.0)
        {
            return true;
        }

        fault = new QuantityFault(start, WriteCode(percent, Unit.Percent, 6), "a tolerance from 0% to 100%");
        percent = 0.0;
        return false;
    }

    /// <summary>Writes a quantity for screens: <c>1.22 kΩ</c>, <c>143 pF</c>, <c>0.4 mm</c>, <c>5 %</c>, without trailing zeros.</summary>
    /// <param name="value">The value in the unit; infinity is written as its sign, a value that is not a number as a dash.</param>
    /// <param name="unit">What it measures.</param>
    /// <param name="figures">Significant figures, 1 to 17.</param>
    /// <exception cref="ArgumentOutOfRangeException">The figures lie outside that range.</exception>
    public static string Write(double value, Unit unit, int figures = 3) => QuantityWriter.Display(value, unit, figures);

    /// <summary>
    /// Writes the letter code of IEC 60062, <c>1k22</c>, <c>4k7</c>, <c>143p</c>, <c>2R2</c>, <c>R47</c>, as <see cref="TryRead"/>
    /// reads it. Lengths, percent, angles, temperatures and levels have no letter code and are written with their sign.
    /// </summary>
    /// <param name="value">The value in the unit, finite.</param>
    /// <param name="unit">What it measures.</param>
    /// <param name="figures">Significant figures, 1 to 17.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite or the figures lie outside that range.</exception>
    public static string WriteCode(double value, Unit unit, int figures = 3) => QuantityWriter.Code(value, unit, figures);

    private static double? TolerancePercent(char letter) => letter switch
    {
        'B' => 0.1,
        'C' => 0.25,
        'D' => 0.5,
        'F' => 1.0,
        'G' => 2.0,
        'J' => 5.0,
        'K' => 10.0,
        'M' => 20.0,
        'N' => 30.0,
        _ => null,
    };
}
