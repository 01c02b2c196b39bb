namespace RegenTrainer.Files;

/// <summary>The folders that hold what is the user's own.</summary>
/// <param name="Settings">Settings, with the user's devices below; null where the user has no home.</param>
/// <param name="State">Recovery, records of open files and the log; null where the user has no home.</param>
public sealed record Places(string? Settings, string? State)
{
    private const string Own = "regentrainer";

    /// <summary>Nowhere at all: nothing is kept.</summary>
    public static Places None { get; } = new(null, null);

    /// <summary>The user's home, which <c>~</c> in a typed path stands for; null where there is none.</summary>
    public string? Home { get; init; }

    /// <summary>The user's devices; null where the user has no home.</summary>
    public string? Devices => Settings is { } folder ? Path.Combine(folder, "devices") : null;

    /// <summary>The places of the user who runs the program.</summary>
    public static Places OfUser() => From(
        Environment.GetEnvironmentVariable,
        Environment.GetFolderPath(Environment.SpecialFolder.UserProfile, Environment.SpecialFolderOption.DoNotVerify),
        OperatingSystem.IsWindows());

    /// <summary>
    /// The places an environment says: <c>$XDG_CONFIG_HOME</c> and <c>$XDG_STATE_HOME</c>, or <c>~/.config</c> and
    /// <c>~/.local/state</c> where they are missing or relative [XDG Base Directory Specification]; on Windows
    /// <c>%APPDATA%</c> and <c>%LOCALAPPDATA%</c>.
    /// </summary>
    /// <param name="environment">The value of a variable, or null.</param>
    /// <param name="home">The user's home, empty for none.</param>
    /// <param name="windows">Whether the system is Windows.</param>
    public static Places From(Func<string, string?> environment, string home, bool windows)
    {
        string? at = Absolute(home);
        string? settings = windows ? Absolute(environment("APPDATA")) : Absolute(environment("XDG_CONFIG_HOME")) ?? Below(at, ".config");
        string? state = windows ? Absolute(environment("LOCALAPPDATA")) : Absolute(environment("XDG_STATE_HOME")) ?? Below(at, ".local", "state");
        return new Places(Below(settings, Own), Below(state, Own)) { Home = at };
    }

    private static string? Absolute(string? path) => Path.IsPathFullyQualified(path ?? "") ? path : null;

    private static string? Below(string? folder, params string[] names) => folder is null ? null : Path.Combine([folder, .. names]);
}
