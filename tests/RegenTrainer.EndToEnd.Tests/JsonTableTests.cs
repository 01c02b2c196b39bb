using System.Text.Json;
using System.Text.RegularExpressions;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>The tables of docs/json.md against what the program writes.</summary>
public sealed partial class JsonTableTests
{
    private const string EveryAnswer = "every answer";

    /// <summary>The ends of keys and the unit each stands for, longest first.</summary>
    private static readonly (string End, string Unit)[] _ends =
    [
        ("_per_s", "1/s"), ("_hz", "Hz"), ("_s", "s"), ("_ohm", "ohm"), ("_siemens", "S"), ("_henry", "H"), ("_farad", "F"), ("_volt", "V"),
        ("_ampere", "A"), ("_watt", "W"), ("_celsius", "°C"), ("_metre", "m"), ("_percent", "%"), ("_degrees", "degrees"), ("_db", "dB"),
    ];

    [Fact]
    public async Task Every_answer_has_the_keys_of_its_table_and_no_other()
    {
        using var faulty = new TemporaryStage("format = \"regentrainer.stage/1\"\ncolour = \"red\"\ntitle = \"T\"\ncircuit = \"plain-tank\"\n");
        (string Section, string[][] Lines)[] answers =
        [
            ("reading", [["reading", "tapped-coil-npn", "--travel", "55", "--json"], ["reading", "plain-tank", "--travel", "100", "--json"]]),
            ("dial", [["dial", "tapped-coil-npn", "--supply", "0.6", "--json"], ["dial", "tapped-coil-npn", "--json"]]),
            ("sidebands", [["sidebands", "tapped-coil-npn", "--json"]]),
            ("bias", [["bias", "tapped-coil-npn", "--json"], ["bias", "crystal-set", "--json"]]),
            ("coil", [["coil", "tapped-coil-npn", "--json"]]),
            ("check", [["check", faulty.Path, "--json"]]),
            ("presets", [["presets", "--json"]]),
        ];
        ILookup<string, (string Key, string Unit)> tables = ReadTables();
        foreach ((string section, string[][] lines) in answers)
        {
            ProgramRun[] runs = await Task.WhenAll(lines.Select(ProgramRun.With));
            var written = new SortedSet<string>(StringComparer.Ordinal);
            foreach (ProgramRun run in runs)
            {
                Assert.Equal($"regentrainer.{section}/1", run.Json.GetProperty("schema").GetString());
                Collect("", run.Json, written);
            }

            bool hasSetting = section is not ("check" or "presets");
            var promised = new SortedSet<string>(
                tables[EveryAnswer].Concat(tables[section]).Concat(hasSetting ? tables["setting"] : []).Select(row => row.Key),
                StringComparer.Ordinal);

            // A group counts by its keys; cautions are there only where there is something to say.
            promised.Remove("setting");
            written.RemoveWhere(key => key is "setting" or "cautions[]");
            Assert.Superset(new SortedSet<string>(promised.Where(key => !key.StartsWith("cautions", StringComparison.Ordinal))), written);
            Assert.Subset(promised, written);
        }
    }

    [Fact]
    public void Every_unit_of_the_tables_agrees_with_the_end_of_its_key()
    {
        foreach ((string key, string unit) in ReadTables().SelectMany(rows => rows))
        {
            string expected = _ends.FirstOrDefault(e => key.EndsWith(e.End, StringComparison.Ordinal)).Unit ?? LastWord(key) switch
            {
                "ohm" => "ohm",
                "volt" => "V",
                "degrees" => "degrees",
                _ => "",
            };
            Assert.True(
                expected.Length > 0 ? unit == expected : unit is "word" or "number" or "truth" or "object",
                $"{key} is said to be in {unit}");
        }
    }

    private static string LastWord(string key) => key[(key.LastIndexOf('.') + 1)..];

    private static void Collect(string path, JsonElement element, SortedSet<string> keys)
    {
        foreach (JsonProperty property in element.EnumerateObject())
        {
            string key = path + property.Name;
            switch (property.Value.ValueKind)
            {
                case JsonValueKind.Object:
                    Collect(key + ".", property.Value, keys);
                    break;
                case JsonValueKind.Array when property.Value.GetArrayLength() == 0:
                    break;
                case JsonValueKind.Array when property.Value[0].ValueKind == JsonValueKind.Object:
                    foreach (JsonElement item in property.Value.EnumerateArray())
                    {
                        Collect(key + "[].", item, keys);
                    }

                    break;
                default:
                    keys.Add(key);
                    break;
            }
        }
    }

    private static ILookup<string, (string Key, string Unit)> ReadTables()
    {
        string section = "";
        var rows = new List<(string Section, string Key, string Unit)>();
        foreach (string line in File.ReadLines(Path.Combine(Repository.Root, "docs", "json.md")))
        {
            if (line.StartsWith("## ", StringComparison.Ordinal))
            {
                section = line[3..];
            }
            else if (Row().Match(line) is { Success: true } row)
            {
                rows.Add((section, row.Groups["key"].Value, row.Groups["unit"].Value));
            }
        }

        return rows.ToLookup(row => row.Section, row => (row.Key, row.Unit));
    }

    [GeneratedRegex(@"^\| `(?<key>[a-z0-9_\[\].]+)` \| (?<unit>[^|]+) \| [^|]+ \|$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Row();
}
