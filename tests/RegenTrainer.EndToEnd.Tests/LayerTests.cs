using System.Reflection;
using System.Runtime.InteropServices;
using NetArchTest.Rules;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>Who may use whom: one table for the projects, one for the folders of the physics, checked over the compiled types.</summary>
public sealed class LayerTests
{
    private const string Core = "RegenTrainer.Core";

    private static readonly Dictionary<string, string[]> _projects = new(StringComparer.Ordinal)
    {
        ["RegenTrainer.Core"] = ["MathNet.Numerics"],
        ["RegenTrainer.Files"] = ["RegenTrainer.Core", "Tomlyn"],
        ["RegenTrainer.Session"] = ["RegenTrainer.Core", "RegenTrainer.Files"],
        ["RegenTrainer"] = ["RegenTrainer.Core", "RegenTrainer.Files", "RegenTrainer.Session", "System.CommandLine", "Terminal.Gui"],
    };

    private static readonly Dictionary<string, string[]> _folders = new(StringComparer.Ordinal)
    {
        ["Quantities"] = [],
        ["Antennas"] = ["Quantities"],
        ["Coils"] = ["Quantities"],
        ["Devices"] = ["Quantities"],
        ["Circuits"] = ["Quantities", "Antennas", "Coils", "Devices"],
        ["Controls"] = ["Quantities"],
        ["Stages"] = ["Quantities", "Antennas", "Coils", "Devices", "Circuits", "Controls"],
        ["Tuning"] = ["Quantities", "Antennas", "Coils", "Devices", "Circuits", "Controls", "Stages"],
        ["Regeneration"] = ["Quantities", "Antennas", "Coils", "Devices", "Circuits", "Controls", "Stages", "Tuning"],
        ["Selectivity"] = ["Quantities", "Antennas", "Coils", "Devices", "Circuits", "Controls", "Stages", "Tuning"],
        ["Readings"] =
            ["Quantities", "Antennas", "Coils", "Devices", "Circuits", "Controls", "Stages", "Tuning", "Regeneration", "Selectivity"],
    };

    /// <summary>What a pure function has no use for.</summary>
    private static readonly string[] _effects =
    [
        "System.IO", "System.Net", "System.Console", "System.Environment", "System.DateTime", "System.DateTimeOffset", "System.TimeProvider",
        "System.Diagnostics.Stopwatch", "System.Diagnostics.Process", "System.Random", "System.Threading.Thread", "System.Threading.Tasks",
        "System.Threading.Timer",
    ];

    [Fact]
    public void Projects_use_only_what_the_table_allows() => Assert.Empty(ForbiddenReferences(_projects));

    [Fact]
    public void Folders_of_the_physics_use_only_what_the_table_allows() => Assert.Empty(ForbiddenUses(_folders));

    [Fact]
    public void Every_folder_of_the_physics_is_in_the_table()
    {
        string[] unknown =
        [
            .. Load(Core).GetTypes()
                .Where(type => type.Namespace?.StartsWith(Core, StringComparison.Ordinal) == true)
                .Select(type => type.Namespace!.Split('.').ElementAtOrDefault(2) ?? "(no folder)")
                .Distinct(StringComparer.Ordinal)
                .Where(folder => !_folders.ContainsKey(folder)),
        ];
        Assert.Empty(unknown);
    }

    [Fact]
    public void The_physics_has_no_effects() =>
        Assert.Empty(Types.InAssembly(Load(Core)).That().HaveDependencyOnAny(_effects).GetTypes().Select(type => type.FullName));

    [Fact]
    public void The_check_fails_a_table_that_forbids_what_is_used()
    {
        var strict = new Dictionary<string, string[]>(_folders, StringComparer.Ordinal) { ["Coils"] = [], ["Readings"] = ["Quantities"] };
        string[] uses = [.. ForbiddenUses(strict)];
        Assert.Contains(uses, use => use.StartsWith("RegenTrainer.Core.Coils.", StringComparison.Ordinal) && use.EndsWith("Quantities", StringComparison.Ordinal));
        Assert.Contains(uses, use => use.StartsWith("RegenTrainer.Core.Readings.", StringComparison.Ordinal) && use.EndsWith("Tuning", StringComparison.Ordinal));

        var alone = new Dictionary<string, string[]>(_projects, StringComparer.Ordinal) { ["RegenTrainer.Files"] = [] };
        Assert.Contains("RegenTrainer.Files uses RegenTrainer.Core", ForbiddenReferences(alone));
    }

    [Fact]
    public void The_check_sees_effects_where_they_are()
    {
        string?[] users =
        [
            .. Types.InAssembly(typeof(LayerTests).Assembly).That().HaveDependencyOnAny(_effects).GetTypes().Select(type => type.FullName),
        ];
        Assert.Contains(typeof(ProgramRun).FullName, users);
        Assert.Contains(typeof(UseInsideLambda).FullName, users);
    }

    private static IEnumerable<string> ForbiddenReferences(Dictionary<string, string[]> table) =>
        from project in table
        from reference in Load(project.Key).GetReferencedAssemblies()
        let name = reference.Name!
        where !project.Value.Contains(name) && !BelongsToRuntime(name)
        select $"{project.Key} uses {name}";

    private static IEnumerable<string> ForbiddenUses(Dictionary<string, string[]> table)
    {
        foreach ((string folder, string[] allowed) in table)
        {
            foreach (string other in table.Keys.Where(key => key != folder && !allowed.Contains(key)))
            {
                IEnumerable<Type> users = Types.InAssembly(Load(Core))
                    .That().ResideInNamespace($"{Core}.{folder}")
                    .And().HaveDependencyOn($"{Core}.{other}")
                    .GetTypes();
                foreach (Type user in users)
                {
                    yield return $"{user.FullName} uses {other}";
                }
            }
        }
    }

    private static bool BelongsToRuntime(string name) =>
        File.Exists(Path.Combine(RuntimeEnvironment.GetRuntimeDirectory(), name + ".dll"));

    private static Assembly Load(string name) => Assembly.Load(name);

    /// <summary>Uses an effect where only the body of a lambda shows it.</summary>
    private sealed class UseInsideLambda
    {
        public static Func<long> Elapsed => () => System.Diagnostics.Stopwatch.GetTimestamp();
    }
}
