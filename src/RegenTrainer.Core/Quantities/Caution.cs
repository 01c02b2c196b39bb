namespace RegenTrainer.Core.Quantities;

/// <summary>Something lies outside the range a method was checked for; the figures stand but deserve less trust.</summary>
public sealed record Caution
{
    /// <summary>Names the kind of caution and says it in words.</summary>
    /// <param name="code">Lower-case letters, digits and single hyphens, beginning with a letter: <c>coil-too-short</c>.</param>
    /// <param name="text">The sentence for the reader; not blank.</param>
    /// <exception cref="ArgumentException">The code is not of that form, or the text is blank.</exception>
    public Caution(string code, string text)
    {
        ArgumentException.ThrowIfNullOrWhiteSpace(code);
        ArgumentException.ThrowIfNullOrWhiteSpace(text);
        if (!IsCode(code))
        {
            throw new ArgumentException(
                $"A caution code is lower-case letters and digits joined by single hyphens, not \"{Printable.Text(code)}\".",
                nameof(code));
        }

        Code = code;
        Text = text;
    }

    /// <summary>The kind of caution, stable for scripts.</summary>
    public string Code { get; }

    /// <summary>The caution in words.</summary>
    public string Text { get; }

    private static bool IsCode(string code)
    {
        if (!char.IsAsciiLetterLower(code[0]) || code[^1] == '-' || code.Contains("--", StringComparison.Ordinal))
        {
            return false;
        }

        return code.All(c => c == '-' || char.IsAsciiLetterLower(c) || char.IsAsciiDigit(c));
    }
}
