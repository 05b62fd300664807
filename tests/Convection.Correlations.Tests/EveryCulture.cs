using System;
using System.Globalization;
using Xunit;

namespace Convection.Correlations.Tests;

/// <summary>Runs a writer in cultures with other decimal signs, digits and casing, and requires one text.</summary>
internal static class EveryCulture
{
    private static readonly string[] Names = ["", "de-DE", "fr-FR", "tr-TR", "fa-IR"];

    public static string Of(Func<string> write)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            string? first = null;
            foreach (string name in Names)
            {
                CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(name);
                string text = write();
                first ??= text;
                Assert.Equal(first, text);
            }

            return first!;
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
