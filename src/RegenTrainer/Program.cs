using RegenTrainer.Commands;

return EntryPoint.Run(args);
