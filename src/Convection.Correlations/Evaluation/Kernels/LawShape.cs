using System.Collections.Generic;
using Convection.Correlations.Laws;
using Convection.Correlations.Selection;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>The laws of one part on one side without their numbers: rungs of a ladder, each of one or more pieces.</summary>
internal sealed class LawShape
{
    public LawShape(LawLadder ladder, LimitRule limits, double lowest, double highest, bool joinsPieces, ShapeNumbers numbers)
    {
        Limits = limits;
        FirstLimit = numbers.Next;
        numbers.Key(limits);
        if (limits != LimitRule.None)
        {
            numbers.Add(lowest);
            numbers.Add(highest);
        }

        numbers.Key(ladder.Count);
        var rungs = new Chain[ladder.Count];
        for (int i = 0; i < rungs.Length; i++)
        {
            rungs[i] = new Chain(ladder[i].Law, joinsPieces, numbers);
        }

        Rungs = rungs;
        FirstPassage = numbers.Next;
        for (int i = 0; i + 1 < rungs.Length; i++)
        {
            AddBand(ladder.Passage(i), numbers);
        }
    }

    public LimitRule Limits { get; }

    /// <summary>Index of the lowest value; the highest follows.</summary>
    public int FirstLimit { get; }

    public Chain[] Rungs { get; }

    /// <summary>Index of the first passage between rungs.</summary>
    public int FirstPassage { get; }

    /// <summary>A band is its low end and the inverse of its width. A band without width is a step, the lower law holding at the joint itself.</summary>
    private static void AddBand((double Low, double High) band, ShapeNumbers numbers)
    {
        numbers.Add(band.Low);
        numbers.Add(band.High > band.Low ? 1 / (band.High - band.Low) : 1e300);
    }

    /// <summary>Pieces that pass into one another.</summary>
    internal sealed class Chain
    {
        public Chain(BoundLaw law, bool joinsPieces, ShapeNumbers numbers)
        {
            var pieces = new List<PieceShape>();
            if (law.Code is { } code)
            {
                pieces.Add(new PieceShape(code, numbers));
            }

            foreach (NormalForm piece in law.Pieces)
            {
                pieces.Add(new PieceShape(piece, numbers));
            }

            numbers.Key(pieces.Count);
            Pieces = [.. pieces];
            FirstBand = numbers.Next;
            for (int i = 0; i < law.Joints.Length; i++)
            {
                AddBand(joinsPieces ? law.Bands[i] : (law.Joints[i], law.Joints[i]), numbers);
            }
        }

        public PieceShape[] Pieces { get; }

        /// <summary>Index of the first band.</summary>
        public int FirstBand { get; }
    }
}
