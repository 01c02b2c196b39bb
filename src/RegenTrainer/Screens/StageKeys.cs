using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens;

/// <summary>What the keys of the hands do to a stage.</summary>
internal static class StageKeys
{
    private const int Fine = Steps.ThousandthsInPercent / 20;
    private const int Usual = Steps.ThousandthsInPercent / 2;
    private const int Coarse = 5 * Steps.ThousandthsInPercent;
    private const double SmallStepHz = 1000;

    /// <summary>Does what a key means; false where it means nothing here.</summary>
    public static bool Press(LiveStage stage, Key key)
    {
        Key bare = key.NoShift.NoCtrl;
        if (bare == Key.CursorLeft || bare == Key.CursorRight)
        {
            int step = key.IsCtrl ? Coarse : key.IsShift ? Fine : Usual;
            stage.TurnControl(bare == Key.CursorLeft ? -step : step);
            return true;
        }

        if (key == Key.Home || key == Key.End)
        {
            stage.SetTravel(key == Key.Home ? 0 : 100);
            return true;
        }

        return !key.IsCtrl && !key.IsAlt && Type(stage, key.AsRune.Value);
    }

    private static bool Type(LiveStage stage, int character)
    {
        Action? action = character switch
        {
            'n' => () => stage.TurnControl(-Fine),
            'm' => () => stage.TurnControl(Fine),
            'N' => () => stage.TurnControl(-Coarse),
            'M' => () => stage.TurnControl(Coarse),
            't' => stage.StandBelowTipOver,
            ',' => () => stage.DialByChannel(up: false),
            '.' => () => stage.DialByChannel(up: true),
            '<' => () => stage.TurnDialBy(-SmallStepHz),
            '>' => () => stage.TurnDialBy(SmallStepHz),
            '[' => () => stage.StationByChannel(up: false),
            ']' => () => stage.StationByChannel(up: true),
            '{' => () => stage.MoveStationBy(-SmallStepHz),
            '}' => () => stage.MoveStationBy(SmallStepHz),
            '=' => stage.StationToDial,
            'v' => () => stage.StepSupply(up: false),
            'V' => () => stage.StepSupply(up: true),
            'c' => () => stage.StepTemperature(up: false),
            'C' => () => stage.StepTemperature(up: true),
            'd' => stage.NextGrade,
            'l' => stage.ToggleLock,
            _ => null,
        };
        action?.Invoke();
        return action is not null;
    }
}
