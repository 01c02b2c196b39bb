using System.Security.Cryptography;
using System.Text;

namespace RegenTrainer.Session.Keeping;

/// <summary>Tells texts and paths apart by a short word.</summary>
internal static class Fingerprint
{
    /// <summary>The SHA-256 [FIPS 180-4] of a text's UTF-8 in hexadecimal letters.</summary>
    public static string Of(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
