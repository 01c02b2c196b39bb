using System.CommandLine;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Reports;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer check STAGE</c>: every fault of a stage file, or its expansion into parts.</summary>
internal static class CheckCommand
{
    public static Command Create(CommandContext context)
    {
        var stage = CommandContext.StageArgument();
        var parts = new Option<bool>("--parts") { Description = "Prints the stage as parts at nodes, a stage file of its own." };
        var command = new Command("check", "Every fault of a stage file in one go; nothing but \"no faults\" where there is none.");
        command.Arguments.Add(stage);
        command.Options.Add(parts);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            if (line.GetValue(parts) && line.GetValue(context.Json))
            {
                throw new StopException(ExitCode.CommandLine, "regentrainer: --parts: found --json beside it, expected one of the two");
            }

            string name = line.GetRequiredValue(stage);
            (StageDesign? design, IReadOnlyList<FileFault> faults) = OpenedStage.TryOpen(name);
            if (line.GetValue(context.Json))
            {
                context.Output.Result(CheckJson.Write(design?.Title, faults));
                return design is null ? ExitCode.Stage : ExitCode.Done;
            }

            if (design is null)
            {
                throw OpenedStage.Refusal(faults);
            }

            context.Output.Result(line.GetValue(parts) ? PartsText.Write(design) : "no faults\n");
            return ExitCode.Done;
        });
        return command;
    }
}
