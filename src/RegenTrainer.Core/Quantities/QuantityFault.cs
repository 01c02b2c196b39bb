namespace RegenTrainer.Core.Quantities;

/// <summary>Why a text is not a quantity.</summary>
/// <param name="Offset">Characters before the first wrong one; the length of the text where something is missing at its end.</param>
/// <param name="Found">Phrase for what stands there; free of control characters.</param>
/// <param name="Expected">Phrase for what should stand there.</param>
public readonly record struct QuantityFault(int Offset, string Found, string Expected)
{
    /// <summary>The fault as a sentence part: <c>found X, expected Y</c>.</summary>
    public string Message => $"found {Found}, expected {Expected}";
}
