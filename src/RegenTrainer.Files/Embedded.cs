using System.Reflection;

namespace RegenTrainer.Files;

/// <summary>The presets and device files inside this assembly.</summary>
internal static class Embedded
{
    private static readonly Assembly _assembly = typeof(Embedded).Assembly;

    /// <summary>Names of embedded files below a folder, in order.</summary>
    public static IReadOnlyList<string> Names(string folder) =>
        [.. _assembly.GetManifestResourceNames().Where(n => n.StartsWith("presets/" + folder, StringComparison.Ordinal)).Order(StringComparer.Ordinal)];

    /// <summary>The text of an embedded file.</summary>
    public static string Text(string name)
    {
        using Stream stream = _assembly.GetManifestResourceStream(name) ?? throw new FileNotFoundException(name);
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
