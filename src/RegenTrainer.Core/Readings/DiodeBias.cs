using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>What a diode does at the operating point, and what the tank sees of it.</summary>
/// <param name="Name">The part's name.</param>
/// <param name="Type">The registered type.</param>
/// <param name="ForwardAmpere">Direct current from anode to cathode in ampere.</param>
/// <param name="ForwardVolt">Direct voltage of the anode lead against the cathode in volt.</param>
/// <param name="JunctionOhm">Resistance of the junction to small signals in ohm, without the series resistance.</param>
/// <param name="JunctionFarad">Capacitance of the junction in farad.</param>
public sealed record DiodeBias(
    string Name, string Type, double ForwardAmpere, double ForwardVolt, double JunctionOhm, double JunctionFarad)
{
    /// <summary>Every diode at the operating point of a workspace, with a caution where a rating is exceeded.</summary>
    internal static IReadOnlyList<DiodeBias> ReadAll(Workspace w, List<Caution> cautions)
    {
        var diodes = new List<DiodeBias>();
        for (int d = 0; d < w.Network.Devices.Count; d++)
        {
            if (w.Network.Devices[d].Part is Diode part)
            {
                TwoPortPoint p = w.Points[d];
                var bias = new DiodeBias(part.Name, part.Model.Name, p.I1, At(w, part.Anode) - At(w, part.Cathode), 1 / p.G11, p.C11);
                diodes.Add(bias);
                AddRatings(part, bias, cautions);
            }
        }

        return diodes;
    }

    private static void AddRatings(Diode part, DiodeBias bias, List<Caution> cautions)
    {
        void Check(double value, double? limit, Unit unit, string what)
        {
            if (limit is { } most && value > most)
            {
                cautions.Add(new Caution(
                    "rating", $"{part.Name}: {what} {QuantityText.Write(value, unit)} is above the rated {QuantityText.Write(most, unit)}"));
            }
        }

        Check(-bias.ForwardVolt, part.Model.Rating?.ReverseVolt, Unit.Volt, "reverse voltage");
        Check(bias.ForwardAmpere, part.Model.Rating?.ForwardAmpere, Unit.Ampere, "forward current");
    }

    private static double At(Workspace w, string node) => w.Network.NodeIndex(node) is >= 0 and int index ? w.Voltages[index] : 0;
}
