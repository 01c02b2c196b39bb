namespace RegenTrainer.Files.Toml;

/// <summary>The known words nearest to a mistyped one, for a message.</summary>
internal static class Nearest
{
    private const int MostWords = 4;
    private const int Slip = 2;

    public static string Words(string typed, IEnumerable<string> known)
    {
        (string Word, int Distance)[] all = [.. known.Select(k => (k, Distance(typed, k))).OrderBy(k => k.Item2).ThenBy(k => k.k, StringComparer.Ordinal)];

        // A word that is nearly right names what was meant; the others would only hide it.
        string[] nearest = [.. all.TakeWhile(k => k.Distance <= Math.Max(Slip, all[0].Distance + 1)).Take(MostWords).Select(k => k.Word)];
        return nearest.Length == 0 ? "no key here" : TableReader.Words(nearest);
    }

    /// <summary>Letters to change, insert or leave out [Levenshtein 1966].</summary>
    private static int Distance(string a, string b)
    {
        if (a.Length > 80)
        {
            return int.MaxValue;
        }

        int[] row = [.. Enumerable.Range(0, b.Length + 1)];
        for (int i = 1; i <= a.Length; i++)
        {
            (int diagonal, row[0]) = (row[0], i);
            for (int j = 1; j <= b.Length; j++)
            {
                int changed = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(changed, 1 + Math.Min(row[j], row[j - 1]));
            }
        }

        return row[b.Length];
    }
}
