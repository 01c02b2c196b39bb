using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer presets</c>: the stages that come with the program.</summary>
internal static class PresetsCommand
{
    public static Command Create(CommandContext context)
    {
        var command = new Command("presets", "The stages that come with the program.");
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            PresetEntry[] entries = [.. Presets.Names.Select(Entry)];
            context.Answer(line, () => PresetsJson.Write(entries), () => Text(entries));
            return ExitCode.Done;
        });
        return command;
    }

    private static PresetEntry Entry(string name)
    {
        StageDesign design = Presets.Read(name);
        return new PresetEntry(name, design.Title, design.Family.Name);
    }

    private static string Text(PresetEntry[] entries)
    {
        var sheet = new Sheet();
        foreach (PresetEntry entry in entries)
        {
            sheet.Row(entry.Name, $"{entry.Title} ({entry.Circuit})");
        }

        return sheet.ToString();
    }
}
