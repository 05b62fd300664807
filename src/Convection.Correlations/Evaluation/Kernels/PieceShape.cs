using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A piece of a law without its amplitudes: what surfaces of one kernel have in common.</summary>
internal sealed class PieceShape
{
    // Room for x up to 1e5, and for the derivative on top.
    private const double MostDigits = 280, DigitsOfX = 5;

    public PieceShape(NormalForm form, ShapeNumbers numbers)
    {
        First = numbers.Next;
        JoinPower = form.M;
        Root = new Exponent(1 / form.M);
        bool isPlain = form.A2 == 0 || form.M == 1;
        Form = form.A2 == 0 ? PieceForm.Single
            : form.M == 1 ? PieceForm.Sum
            : FitsTheRange(form) ? PieceForm.Joined
            : PieceForm.JoinedScaled;
        double power = Form == PieceForm.Joined ? form.M : 1;
        FirstExponent = new Exponent(power * form.N1);
        SecondExponent = new Exponent(power * form.N2);
        numbers.Add(Math.Pow(form.A1, power));
        if (form.A2 != 0)
        {
            numbers.Add(Math.Pow(form.A2, power));
        }

        numbers.Key(Form);
        numbers.Key(FirstExponent.Value);
        numbers.Key(SecondExponent.Value);
        numbers.Key(isPlain ? 1 : form.M);
    }

    public PieceShape(Func<double, LawValue> code, ShapeNumbers numbers)
    {
        Form = PieceForm.Code;
        Code = code;
        numbers.Key(code);
    }

    public PieceForm Form { get; }

    /// <summary>Index of the first amplitude.</summary>
    public int First { get; }

    public Exponent FirstExponent { get; }

    public Exponent SecondExponent { get; }

    /// <summary>m.</summary>
    public double JoinPower { get; }

    /// <summary>1/m.</summary>
    public Exponent Root { get; }

    public Func<double, LawValue>? Code { get; }

    private static bool FitsTheRange(NormalForm f)
        => f.A1 > 0 && f.A2 > 0 && Fits(f.M, f.A1, f.N1) && Fits(f.M, f.A2, f.N2);

    private static bool Fits(double m, double a, double n)
        => m * (Math.Log10(a) + (DigitsOfX * n)) < MostDigits && m * Math.Log10(a) > -MostDigits / 2;
}
