using System;

namespace Convection.Correlations.Laws;

/// <summary>Writes formulas as an engineer would.</summary>
internal static class FormulaText
{
    private static readonly int[] Denominators = [2, 3, 4, 5, 6];

    public static string Symbol(CharacteristicLength length) => length switch
    {
        CharacteristicLength.Height => "H",
        CharacteristicLength.HydraulicDiameter => "Dh",
        CharacteristicLength.AreaToPerimeter => "(A/P)",
        CharacteristicLength.AlongFlow => "L",
        CharacteristicLength.HalfShortSide => "R",
        CharacteristicLength.RoomCubeRoot => "V^(1/3)",
        CharacteristicLength.MeanSide => "Lm",
        _ => string.Empty,
    };

    public static string Symbol(DrivingVariable variable) => variable switch
    {
        DrivingVariable.TemperatureDifference => "|ΔT|",
        DrivingVariable.AirChangeRate => "ACH",
        DrivingVariable.JetMomentum => "J",
        DrivingVariable.FlowPerLength => "(V̇/L)",
        DrivingVariable.Speed => "U",
        DrivingVariable.PartRatio => "h_f/h_n",
        _ => string.Empty,
    };

    public static string Name(DrivingVariable variable) => variable switch
    {
        DrivingVariable.TemperatureDifference => "a temperature difference",
        DrivingVariable.AirChangeRate => "a supply flow",
        DrivingVariable.JetMomentum => "a supply flow through an opening of known area",
        DrivingVariable.FlowPerLength => "a supply flow per length of façade",
        DrivingVariable.Speed => "a speed",
        DrivingVariable.PartRatio => "the ratio of two parts",
        _ => "nothing",
    };

    public static string Unit(DrivingVariable variable) => variable switch
    {
        DrivingVariable.TemperatureDifference => "K",
        DrivingVariable.AirChangeRate => "1/h",
        DrivingVariable.FlowPerLength => "m³/(h·m)",
        DrivingVariable.Speed => "m/s",
        _ => string.Empty,
    };

    /// <summary>A power, empty for an exponent of zero or a missing symbol.</summary>
    public static string Power(string symbol, double exponent)
        => exponent == 0 || symbol.Length == 0 ? string.Empty : exponent == 1 ? symbol : symbol + "^" + Exponent(exponent);

    /// <summary>Factors joined by a dot; empty ones are left out.</summary>
    public static string Product(params string[] factors) => string.Join("·", Array.FindAll(factors, f => f.Length > 0));

    public static string Exponent(double exponent)
    {
        foreach (int denominator in Denominators)
        {
            double numerator = exponent * denominator;
            if (Math.Abs(numerator - Math.Round(numerator)) < 1e-12 && Math.Abs((exponent * 100) - Math.Round(exponent * 100)) > 1e-9)
            {
                return "(" + InvariantText.Number(Math.Round(numerator)) + "/" + InvariantText.Number(denominator) + ")";
            }
        }

        return exponent < 0 ? "(" + InvariantText.Number(exponent) + ")" : InvariantText.Number(exponent);
    }
}
