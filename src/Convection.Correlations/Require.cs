using System;
using System.Diagnostics.CodeAnalysis;

namespace Convection.Correlations;

/// <summary>Refuses impossible input with an error that names the quantity, the value, the unit and the allowed interval.</summary>
internal static class Require
{
    public static T NotNull<T>([NotNull] T? value, string name)
        where T : class
    {
        if (value is null)
        {
            throw new ArgumentNullException(name);
        }

        return value;
    }

    public static string Name(string? value, string name)
    {
        if (string.IsNullOrWhiteSpace(value))
        {
            throw new ArgumentException("A name of at least one visible character is needed.", name);
        }

        return value!;
    }

    /// <summary>Accepts lowest &lt;= value &lt;= highest; NaN and infinities are refused.</summary>
    public static double Within(double value, double lowest, double highest, string quantity, string unit, string name)
    {
        if (!(value >= lowest && value <= highest))
        {
            Refuse(value, quantity, unit, InvariantText.Interval(lowest, highest, unit), name);
        }

        return value;
    }

    /// <summary>Accepts 0 &lt; value &lt;= highest; NaN and infinities are refused.</summary>
    public static double Positive(double value, double highest, string quantity, string unit, string name)
    {
        if (!(value > 0 && value <= highest))
        {
            Refuse(value, quantity, unit, InvariantText.OpenInterval(0, highest, unit), name);
        }

        return value;
    }

    public static double Finite(double value, string quantity, string unit, string name)
    {
        if (double.IsNaN(value) || double.IsInfinity(value))
        {
            Refuse(value, quantity, unit, "a finite number", name);
        }

        return value;
    }

    public static T Defined<T>(T value, T unspecified, string quantity, string name)
        where T : struct, Enum
    {
        if (value.Equals(unspecified) || !Enum.IsDefined(typeof(T), value))
        {
            throw new ArgumentOutOfRangeException(name, value, quantity + " must be one of: " + string.Join(", ", Named<T>(unspecified)) + ".");
        }

        return value;
    }

    private static string[] Named<T>(T unspecified)
        where T : struct, Enum
    {
        return Array.FindAll(Enum.GetNames(typeof(T)), n => n != unspecified.ToString());
    }

    [DoesNotReturn]
    private static void Refuse(double value, string quantity, string unit, string allowed, string name)
        => throw new ArgumentOutOfRangeException(
            name,
            value,
            quantity + " " + InvariantText.Number(value, unit) + " is not accepted; it must be " + allowed + ".");
}
