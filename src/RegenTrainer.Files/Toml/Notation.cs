using System.Globalization;
using System.Text;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files.Toml;

/// <summary>Writes single values in TOML notation.</summary>
internal static class Notation
{
    private const int MostFigures = 17;

    /// <summary>A text in quotes, with what TOML wants escaped.</summary>
    public static string Quoted(string text)
    {
        var result = new StringBuilder("\"");
        foreach (char c in text)
        {
            result.Append(c switch
            {
                '"' => "\\\"",
                '\\' => "\\\\",
                '\n' => "\\n",
                '\t' => "\\t",
                '\r' => "\\r",
                < ' ' or '\u007f' => $"\\u{(int)c:X4}",
                _ => c.ToString(),
            });
        }

        return result.Append('"').ToString();
    }

    /// <summary>A plain number that reads back to the last bit.</summary>
    public static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>A list of values that are in TOML notation already.</summary>
    public static string List(IEnumerable<string> values) => $"[{string.Join(", ", values)}]";

    /// <summary>
    /// A quantity in quotes as the trade writes it, with as few figures as read back to the same number; without a letter
    /// where the text it replaces had none.
    /// </summary>
    public static string Trade(double value, Unit unit, string? replaced)
    {
        bool bare = replaced is { Length: > 0 } && replaced.All(c => c == '.' || char.IsAsciiDigit(c));
        if (bare && Math.Abs(value) is >= 0.001 and < 1e6)
        {
            return Quoted(Number(value));
        }

        // A text with a gap has its unit spelled out: 0.4 mm, 530 kHz.
        bool spelled = replaced is not null && replaced.Trim().Contains(' ', StringComparison.Ordinal);
        for (int figures = 3; figures <= MostFigures; figures++)
        {
            string code = spelled ? QuantityText.Write(value, unit, figures) : QuantityText.WriteCode(value, unit, figures);
            if (QuantityText.TryRead(code, unit, out double back, out _) && back == value)
            {
                return Quoted(code);
            }
        }

        return Number(value);
    }
}
