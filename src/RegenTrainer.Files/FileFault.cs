using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files;

/// <summary>What is wrong in a file, and where.</summary>
/// <param name="File">Name of the file as the user gave it.</param>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
/// <param name="Found">What stands there, a phrase.</param>
/// <param name="Expected">What was expected, a phrase.</param>
public sealed record FileFault(string File, int Line, int Column, string Found, string Expected)
{
    /// <summary>The message: <c>FILE:LINE:COL: found X, expected Y</c>, safe to print.</summary>
    public override string ToString() =>
        $"{Printable.Text(File)}:{Line}:{Column}: found {Printable.Text(Found)}, expected {Printable.Text(Expected)}";
}
