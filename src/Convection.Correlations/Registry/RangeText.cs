using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Registry;

/// <summary>Symbols and units of range variables, for texts.</summary>
internal static class RangeText
{
    public static string Symbol(RangeVariable variable) => variable switch
    {
        RangeVariable.TemperatureDifference => "|ΔT|",
        RangeVariable.Rayleigh => "Ra",
        RangeVariable.Grashof => "Gr",
        RangeVariable.ModifiedRayleigh => "Ra*",
        RangeVariable.Reynolds => "Re",
        RangeVariable.Prandtl => "Pr",
        RangeVariable.AirChangeRate => "supply air changes",
        RangeVariable.JetMomentum => "J",
        RangeVariable.FlowPerLength => "flow per façade length",
        RangeVariable.Tilt => "tilt",
        RangeVariable.FlowTilt => "tilt to the heat flow",
        RangeVariable.TiltedRayleigh => "Ra·sin(tilt to the heat flow)",
        RangeVariable.Height => "height",
        RangeVariable.Archimedes => "Ar",
        _ => variable.ToString(),
    };

    public static string Unit(RangeVariable variable) => variable switch
    {
        RangeVariable.TemperatureDifference => "K",
        RangeVariable.AirChangeRate => "1/h",
        RangeVariable.FlowPerLength => "m³/(h·m)",
        RangeVariable.Tilt or RangeVariable.FlowTilt => "°",
        RangeVariable.Height => "m",
        _ => string.Empty,
    };

    /// <summary>Dimensionless groups of flow are written with an exponent, all else plainly.</summary>
    public static Func<double, string> Writer(RangeVariable variable) => variable is RangeVariable.Rayleigh or RangeVariable.Grashof
        or RangeVariable.ModifiedRayleigh or RangeVariable.TiltedRayleigh or RangeVariable.Reynolds
            ? InvariantText.Exponential
            : InvariantText.Number;

    public static string Name(CharacteristicLength length) => length switch
    {
        CharacteristicLength.Height => "H",
        CharacteristicLength.HydraulicDiameter => "4A/P",
        CharacteristicLength.AreaToPerimeter => "A/P",
        CharacteristicLength.AlongFlow => "L along the flow",
        CharacteristicLength.HalfShortSide => "half the short side",
        CharacteristicLength.RoomCubeRoot => "V^(1/3)",
        CharacteristicLength.MeanSide => "the mean of the sides",
        _ => string.Empty,
    };
}
