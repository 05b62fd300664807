using Convection.Correlations.Registry;

namespace Convection.Correlations.Literature;

/// <summary>The published correlations that this library ships.</summary>
public static class PublishedLiterature
{
    /// <summary>Version of the shipped data. It changes whenever a number, a range or a doubt changes.</summary>
    public const string DataVersion = "2026.12";

    /// <summary>The registry of everything shipped.</summary>
    /// <remarks>Made once, when first asked for; immutable and safe to share between threads.</remarks>
    public static CorrelationRegistry Registry => Holder.Registry;

    private static class Holder
    {
        public static readonly CorrelationRegistry Registry = new(
            [
                .. AlamdariHammond1983.All,
                .. AwbiHatton1999.All,
                .. ChurchillChu1975.All,
                .. Colburn1933.All,
                .. Fisher1995.All,
                .. FisherPedersen1997.All,
                .. Iso6946.All,
                .. KhalifaMarshall1990.All,
                .. Min1956.All,
                .. Pohlhausen1921.All,
            ],
            DataVersion);
    }
}
