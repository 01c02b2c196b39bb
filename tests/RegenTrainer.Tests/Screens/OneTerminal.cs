namespace RegenTrainer.Tests.Screens;

/// <summary>Statics of the screen library are the process's: tests that use it run one after the other.</summary>
[CollectionDefinition(Name, DisableParallelization = true)]
public sealed class OneTerminal
{
    public const string Name = "terminal";
}
