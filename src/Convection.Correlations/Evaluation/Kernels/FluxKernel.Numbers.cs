using System.Runtime.CompilerServices;
#if !NET
using T = Convection.Correlations.Evaluation.Kernels.ScalarLane;
#endif

namespace Convection.Correlations.Evaluation.Kernels;

/// <content>What kernels read.</content>
#if NET
internal static unsafe partial class FluxKernel<T>
#else
internal static unsafe partial class FluxKernel
#endif
{
    /// <summary>The numbers of the surfaces in a lane: those of one surface in a row, or columns of a group of surfaces.</summary>
    internal readonly struct Numbers
    {
        private readonly double* pool;
        private readonly int* columns;
        private readonly int lane;

        /// <summary>One surface.</summary>
        public Numbers(double* pool)
        {
            this.pool = pool;
            columns = null;
            lane = 0;
        }

        /// <summary>Columns: each begins at its entry, or, where all surfaces share one number, at the entry's complement.</summary>
        public Numbers(double* pool, int* columns, int lane)
        {
            this.pool = pool;
            this.columns = columns;
            this.lane = lane;
        }

        public T this[int k]
        {
            [MethodImpl(MethodImplOptions.AggressiveInlining)]
            get
            {
                if (columns == null)
                {
                    return T.Of(pool[k]);
                }

                int start = columns[k];
                return start < 0 ? T.Of(pool[~start]) : T.Load(pool + start + lane);
            }
        }
    }

    /// <summary>A heat flux with its slopes: value [W/m²], and per kelvin of surface, room and supply temperature [W/(m²·K)].</summary>
    internal struct Flux(T value, T surface, T room, T supply)
    {
        public T Value = value, Surface = surface, Room = room, Supply = supply;

        /// <summary>A mask of where there is a flux at all, in value or slopes.</summary>
        public readonly T IsSomething => ~(T.Abs(Value | Surface | Room | Supply) <= T.Of(0));

        public static Flux Select(T mask, Flux yes, Flux no) => new(
            T.Select(mask, yes.Value, no.Value),
            T.Select(mask, yes.Surface, no.Surface),
            T.Select(mask, yes.Room, no.Room),
            T.Select(mask, yes.Supply, no.Supply));

        public readonly Flux Where(T mask) => new(Value & mask, Surface & mask, Room & mask, Supply & mask);

        public readonly Flux Times(T factor) => new(Value * factor, Surface * factor, Room * factor, Supply * factor);

        public readonly Flux Plus(Flux other) => new(Value + other.Value, Surface + other.Surface, Room + other.Room, Supply + other.Supply);
    }
}
