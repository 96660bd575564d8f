namespace FrameSafe;

/// <summary>Rapidities of one line add across frames: of B in A and of C in B, it is that of C in A.</summary>
public static class RapidityAddition
{
    extension<TFrame, TOther, TNext>(Rapidity<TFrame, TOther>)
        where TFrame : struct, IFrame
        where TOther : struct, IFrame
        where TNext : struct, IFrame
    {
        /// <summary>The rapidity of the last frame in the first.</summary>
        public static Rapidity<TFrame, TNext> operator +(Rapidity<TFrame, TOther> first, Rapidity<TOther, TNext> second) => first.Then(second);
    }
}
