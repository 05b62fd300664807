namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>Exponents that roots and products serve, and the rest.</summary>
internal enum ExponentKind
{
    Zero,
    One,
    Two,
    Three,
    Half,
    ThreeHalves,
    Quarter,
    Third,
    TwoThirds,
    Sixth,
    Fifth,
    FourFifths,
    Other,
}
