using System;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>Surfaces with equal keys run through one kernel and differ in their numbers alone.</summary>
internal sealed class ShapeKey(object[] parts) : IEquatable<ShapeKey>
{
    public bool Equals(ShapeKey? other)
    {
        if (other is null || other.Count != Count)
        {
            return false;
        }

        for (int i = 0; i < parts.Length; i++)
        {
            if (!parts[i].Equals(other.Part(i)))
            {
                return false;
            }
        }

        return true;
    }

    public override bool Equals(object? obj) => Equals(obj as ShapeKey);

    public override int GetHashCode()
    {
        int hash = 17;
        foreach (object part in parts)
        {
            hash = unchecked((hash * 31) + part.GetHashCode());
        }

        return hash;
    }

    private int Count => parts.Length;

    private object Part(int i) => parts[i];
}
