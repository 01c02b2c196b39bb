using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Drawing;
using RegenTrainer.Files;
using RegenTrainer.Files.Reports;
using RegenTrainer.Screens;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer [STAGE]</c>: opens the screen, or prints the reading where there is no terminal.</summary>
internal static class OpenCommand
{
    private static readonly Dictionary<string, GlyphSet> _glyphSets = new(StringComparer.Ordinal)
    {
        ["braille"] = GlyphSet.Braille,
        ["blocks"] = GlyphSet.Blocks,
        ["ascii"] = GlyphSet.Ascii,
    };

    /// <summary>Makes the root of the command line.</summary>
    /// <param name="context">What every command works with.</param>
    /// <param name="alone">Whether the line names no command first; with one the root takes nothing itself and the command's help stays free of it.</param>
    public static RootCommand Create(CommandContext context, bool alone)
    {
        var root = new RootCommand("Sets up tuned radio stages with regeneration: opens the screen, or answers one command.");
        if (alone)
        {
            AddScreen(root, context);
        }

        return root;
    }

    private static void AddScreen(RootCommand root, CommandContext context)
    {
        var stage = new Argument<string?>("STAGE")
        {
            Description = $"A stage file's path or a preset's name. Default: {Presets.Default}.",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var setting = new SettingOptions();
        root.Arguments.Add(stage);
        setting.AddTo(root);
        setting.AddAudioTo(root);
        Option<GlyphSet?> glyphs = Options.Choice(
            "--glyphs", _glyphSets, "Characters the screen is drawn with. Default: what locale and terminal can show.");
        root.Options.Add(glyphs);
        root.Options.Add(context.Json);
        root.SetAction(line =>
        {
            string name = line.GetValue(stage) ?? Presets.Default;
            OpenedStage opened = OpenedStage.Open(name);
            Setting asked = setting.Read(line, opened);
            if (!line.GetValue(context.Json) && !Console.IsOutputRedirected && ScreenCommand.CanRun())
            {
                return ScreenCommand.Run(opened.Document, asked, setting.AudioHz(line), line.GetValue(glyphs), FaultLog.Keep);
            }

            Reading reading = StageReader.Read(new StageWorkspace(opened.Model), asked, setting.AudioHz(line));
            context.Answer(
                line,
                () => ReadingJson.Write(opened.Title, reading),
                () => ReadingText.Of(opened.Title, reading) + "\nThe screen needs a terminal: start regentrainer in one to open it.\n");
            return ExitCode.Done;
        });
    }
}
