namespace Convection.Correlations.Laws;

/// <summary>Passage from one law to another over a band of the driving variable, with a continuous slope.</summary>
internal static class Crossfade
{
    /// <summary>Weight of the upper law: 0 below the band, 1 above it, u²(3 − 2u) inside.</summary>
    public static double Weight(double x, double low, double high)
    {
        double u = Clamp((x - low) / (high - low));
        return u * u * (3 - (2 * u));
    }

    /// <summary>Mixture of two laws at x, the change of the weight included in the sensitivity.</summary>
    public static LawValue Between(LawValue lower, LawValue upper, double x, double low, double high)
    {
        double u = Clamp((x - low) / (high - low));
        double weight = u * u * (3 - (2 * u));
        double slope = 6 * u * (1 - u) / (high - low);
        return new LawValue(
            lower.Coefficient + (weight * (upper.Coefficient - lower.Coefficient)),
            lower.Sensitivity + (weight * (upper.Sensitivity - lower.Sensitivity)) + (x * slope * (upper.Coefficient - lower.Coefficient)));
    }

    private static double Clamp(double u) => u <= 0 ? 0 : u >= 1 ? 1 : u;
}
