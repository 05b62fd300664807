using System;

namespace Convection.Correlations.Registry;

/// <summary>A closed interval; an end may be open towards infinity.</summary>
/// <remarks>The default value is the single point 0 and stands for no interval that a range accepts.</remarks>
public readonly record struct Interval
{
    /// <summary>An interval.</summary>
    /// <param name="lowest">Lower end; minus infinity for none.</param>
    /// <param name="highest">Upper end; infinity for none; above the lower end.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ends are reversed, equal or not numbers.</exception>
    public Interval(double lowest, double highest)
    {
        if (!(lowest < highest))
        {
            throw new ArgumentOutOfRangeException(
                nameof(highest),
                highest,
                "Interval " + InvariantText.Interval(lowest, highest, string.Empty) + " is not accepted; its upper end must lie above its lower end.");
        }

        Lowest = lowest;
        Highest = highest;
    }

    /// <summary>Lower end.</summary>
    public double Lowest { get; }

    /// <summary>Upper end.</summary>
    public double Highest { get; }

    /// <summary>From a value upwards.</summary>
    /// <param name="lowest">Lower end.</param>
    /// <returns>The interval.</returns>
    public static Interval From(double lowest) => new(lowest, double.PositiveInfinity);

    /// <summary>Up to a value.</summary>
    /// <param name="highest">Upper end.</param>
    /// <returns>The interval.</returns>
    public static Interval UpTo(double highest) => new(double.NegativeInfinity, highest);

    /// <summary>True where the value lies inside or on an end.</summary>
    /// <param name="value">The value.</param>
    /// <returns>False for NaN.</returns>
    public bool Contains(double value) => value >= Lowest && value <= Highest;

    internal Interval Times(double factor) => new(Lowest * factor, Highest * factor);

    internal bool Encloses(Interval inner) => inner.Lowest >= Lowest && inner.Highest <= Highest;
}
