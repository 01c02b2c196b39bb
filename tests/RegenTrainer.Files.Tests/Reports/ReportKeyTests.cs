using System.Text;
using System.Text.Json;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Files.Tests.Reports;

/// <summary>The keys are a promise to scripts: they are written out here, not taken from the code.</summary>
public sealed class ReportKeyTests
{
    private const string Head = "schema stage setting cautions ";

    [Fact]
    public void A_reading_has_the_promised_keys()
    {
        JsonElement answer = Parse(ReadingJson.Write("Tern Point", SampleAnswers.Full));
        Assert.Equal(
            Head + "effective_q q_regeneration_off q_at_idle_stop bandwidth_hz tank_hz growth_per_s stage_gain_db ring_time_s "
            + "tuning_farad control_ohm travel_percent tip_over_state tip_over_percent tip_over_ohm tip_overs margin_db "
            + "margin_percent margin_degrees device_margin_db regime dial_mode reachable pulled_hz speech_index audio_3db_hz "
            + "audio_6db_hz audio_10db_hz bandwidth_dial_degrees hand_shift_hz sidebands stray_modes parasitic",
            Keys(answer));
        Assert.Equal("audio_hz upper_db lower_db audio_db", Keys(answer.GetProperty("sidebands")[0]));
        Assert.Equal("frequency_hz decay_per_s grows", Keys(answer.GetProperty("stray_modes")[0]));
        Assert.Equal("travel_percent degrees ohm upward frequency_hz tuning_farad", Keys(answer.GetProperty("tip_overs")[0]));
        Assert.Equal(
            "dial_hz station_hz travel_percent supply_volt temperature_celsius grade device dial_mode",
            Keys(answer.GetProperty("setting")));
        Assert.Equal("code text", Keys(answer.GetProperty("cautions")[0]));
        Assert.Equal("regentrainer.reading/1", answer.GetProperty("schema").GetString());
        Assert.Equal("Tern Point", answer.GetProperty("stage").GetString());
    }

    [Fact]
    public void A_feedback_factor_has_keys_of_its_own()
    {
        JsonElement answer = Parse(ReadingJson.Write("Tank", SampleAnswers.Full with { ControlUnit = Core.Quantities.Unit.None }));
        Assert.Equal(1220, answer.GetProperty("control_factor").GetDouble());
        Assert.Equal(1130, answer.GetProperty("tip_over_factor").GetDouble());
        Assert.Equal(1400, answer.GetProperty("tip_overs")[0].GetProperty("factor").GetDouble());
        Assert.False(answer.TryGetProperty("control_ohm", out _));
        Assert.False(answer.TryGetProperty("tip_over_ohm", out _));
    }

    [Fact]
    public void The_other_answers_have_the_promised_keys()
    {
        JsonElement dial = Parse(DialJson.Write("S", SampleAnswers.Setting, null, SampleAnswers.Points, (5.5e5, 1.9e6), []));
        Assert.Equal(Head + "points reach_low_hz reach_high_hz dead_spots", Keys(dial));
        Assert.Equal("from_hz to_hz reason", Keys(dial.GetProperty("dead_spots")[0]));
        Assert.Equal("out-of-reach", dial.GetProperty("dead_spots")[0].GetProperty("reason").GetString());
        Assert.Equal(
            "dial_hz reachable tuning_farad tip_over_state tip_over_percent effective_q bandwidth_hz stage_gain_db pulled_hz",
            Keys(dial.GetProperty("points")[0]));

        JsonElement sidebands = Parse(SidebandsJson.Write(
            "S", SampleAnswers.Full, SampleAnswers.Interaction, [new Neighbour(1e4, -28)], [new ResponsePoint(1e6, 31, -5)]));
        Assert.Equal(
            Head + "effective_q bandwidth_hz tank_hz stage_gain_db regime reachable speech_index audio_3db_hz audio_6db_hz "
            + "audio_10db_hz sidebands neighbours approach_from_percent approach_to_percent approach_from_stop approach_pull_hz "
            + "repeak_farad repeak_degrees bandwidth_dial_degrees vernier_ratio hand_shift_hz station_offset_hz carrier_loss_db "
            + "off_tune response",
            Keys(sidebands));
        Assert.Equal("audio_hz asymmetry_db second_harmonic_percent", Keys(sidebands.GetProperty("off_tune")[0]));
        Assert.Equal("offset_hz relative_db", Keys(sidebands.GetProperty("neighbours")[0]));
        Assert.Equal("frequency_hz gain_db phase_degrees", Keys(sidebands.GetProperty("response")[0]));

        JsonElement bias = Parse(BiasJson.Write("S", SampleAnswers.Bias, SampleAnswers.Headroom));
        Assert.Equal(
            Head + "devices diodes nodes supply_ampere residual_ampere first_limit_device first_limit first_limit_antenna_volt "
            + "first_limit_tank_volt first_limit_output_volt supply_fresh_ampere supply_tired_ampere battery_life_s per_kelvin "
            + "per_tenth_volt",
            Keys(bias));
        Assert.Equal("collector_ampere tip_over_percent effective_q tank_hz", Keys(bias.GetProperty("per_kelvin")));
        Assert.Equal(Keys(bias.GetProperty("per_kelvin")), Keys(bias.GetProperty("per_tenth_volt")));
        Assert.Equal("saturation", bias.GetProperty("first_limit").GetString());
        Assert.Equal(
            "name type collector_ampere base_ampere base_emitter_volt collector_emitter_volt transconductance_siemens "
            + "current_gain dissipation_watt saturated cut_off_antenna_volt cut_off_tank_volt cut_off_output_volt "
            + "saturation_antenna_volt saturation_tank_volt saturation_output_volt",
            Keys(bias.GetProperty("devices")[0]));
        Assert.Equal("name type forward_ampere forward_volt junction_ohm junction_farad", Keys(bias.GetProperty("diodes")[0]));
        Assert.Equal("node volt", Keys(bias.GetProperty("nodes")[0]));

        JsonElement coil = Parse(CoilJson.Write(null, SampleAnswers.Coil));
        Assert.Equal(
            Head + "inductance_henry inductance_matrix_henry q at_hz resistance_ohm self_capacitance_farad wire_length_metre effective_height_metre windings",
            Keys(coil));
        Assert.Equal(
            "name turns inductance_henry q resistance_ohm self_capacitance_farad wire_length_metre",
            Keys(coil.GetProperty("windings")[0]));

        JsonElement check = Parse(CheckJson.Write(null, [new FileFault("a.toml", 3, 7, "x", "y")]));
        Assert.Equal(Head + "faults", Keys(check));
        Assert.Equal("file line column found expected", Keys(check.GetProperty("faults")[0]));

        JsonElement presets = Parse(PresetsJson.Write([new PresetEntry("tapped-coil-npn", "Tern Point", "tapped-coil")]));
        Assert.Equal(Head + "presets", Keys(presets));
        Assert.Equal("name title circuit", Keys(presets.GetProperty("presets")[0]));
    }

    internal static JsonElement Parse(byte[] json) => JsonDocument.Parse(Encoding.UTF8.GetString(json)).RootElement;

    private static string Keys(JsonElement element) => string.Join(' ', element.EnumerateObject().Select(p => p.Name));
}
