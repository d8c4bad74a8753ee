using System.Runtime.CompilerServices;

namespace FlowDuct.Fluids.Gases;

/// <summary>One interval made ready to evaluate: integration factors divided out, constants set by the joints and the datum.</summary>
/// <remarks>Equations of NASA/TP-2002-211556 (2002) for cp/R, h/R and s0/R, in Horner form.</remarks>
internal readonly struct CaloricPiece
{
    internal readonly double Thigh;
    private readonly double a1, a2, a3, a4, a5, a6, a7;
    private readonly double h4, h5, h6, h7;
    private readonly double s5, s6, s7;
    private readonly double b1, b2;

    internal CaloricPiece(Nasa9Interval interval)
        : this(interval, interval.b1, interval.b2)
    {
    }

    private CaloricPiece(Nasa9Interval i, double b1, double b2)
    {
        Thigh = i.Thigh;
        (a1, a2, a3, a4, a5, a6, a7) = (i.a1, i.a2, i.a3, i.a4, i.a5, i.a6, i.a7);
        (h4, h5, h6, h7) = (a4 / 2, a5 / 3, a6 / 4, a7 / 5);
        (s5, s6, s7) = (a5 / 2, a6 / 3, a7 / 4);
        (this.b1, this.b2) = (b1, b2);
    }

    /// <summary>The same interval, moved so that h/R and s0/R pass through a given point.</summary>
    internal static CaloricPiece Through(Nasa9Interval interval, double T, double h, double s0)
    {
        Reduced at = new CaloricPiece(interval).At(T);
        return new CaloricPiece(interval, interval.b1 + h - at.h, interval.b2 + s0 - at.s0);
    }

    /// <summary>A piece of constant heat capacity that passes through a given point.</summary>
    internal static CaloricPiece ConstantThrough(double Tlow, double T, in Reduced at)
    {
        Nasa9Interval constant = new(Tlow, T) { a1 = 0, a2 = 0, a3 = at.cp, a4 = 0, a5 = 0, a6 = 0, a7 = 0, b1 = 0, b2 = 0 };
        return Through(constant, T, at.h, at.s0);
    }

    /// <summary>cp/R, h/R (K) and s0/R at T, K.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    internal Reduced At(double T)
    {
        double i = 1 / T;
        double lnT = Math.Log(T);
        double a1i = a1 * i;
        return new Reduced(
            cp: (((a1i + a2) * i) + a3) + (T * (a4 + (T * (a5 + (T * (a6 + (T * a7))))))),
            h: (b1 - a1i + (a2 * lnT)) + (T * (a3 + (T * (h4 + (T * (h5 + (T * (h6 + (T * h7))))))))),
            s0: (b2 - (((a1i / 2) + a2) * i) + (a3 * lnT)) + (T * (a4 + (T * (s5 + (T * (s6 + (T * s7))))))));
    }
}

/// <summary>Caloric properties over the gas constant.</summary>
internal readonly struct Reduced
{
    /// <summary>cp/R.</summary>
    internal readonly double cp;

    /// <summary>h/R, K.</summary>
    internal readonly double h;

    /// <summary>s0/R at the reference pressure.</summary>
    internal readonly double s0;

    internal Reduced(double cp, double h, double s0) => (this.cp, this.h, this.s0) = (cp, h, s0);
}
