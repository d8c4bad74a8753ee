namespace FlowDuct.Fluids.Gases;

/// <summary>A term of the critical region that is no analytic function: n Delta^b delta Psi of R. Span, W. Wagner (1996), Table 32.</summary>
/// <remarks>
/// theta = 1 - tau + A z^(1/(2 beta)), Delta = theta^2 + B z^a, Psi = exp(-C z - D (tau - 1)^2), z = (delta - 1)^2. At the critical point
/// Delta is zero and its derivatives have no bound; Delta is kept from falling below a floor, so that every answer is a number.
/// </remarks>
internal readonly struct NonanalyticTerm(double n, double a, double b, double beta, double A, double B, double C, double D)
{
    // A kelvin over 1e15: where theta is nothing but rounding.
    private const double LeastDelta = 1e-30;

    // Below the last digit of anything.
    private const double MostExponent = 60;

    private readonly double n = n, a = a, b = b, power = 1 / (2 * beta), A = A, B = B, C = C, D = D;

    /// <summary>Adds the term at delta = x, tau = y.</summary>
    internal static void Add(double x, double y, in NonanalyticTerm term, ref HelmholtzSums sum)
    {
        if (term.Exponent(x, y) < MostExponent) term.Add(x, y, ref sum);
    }

    /// <summary>Adds the derivatives by density alone.</summary>
    internal static void AddByDensity(double x, double y, in NonanalyticTerm term, ref double gx, ref double gxx)
    {
        if (!(term.Exponent(x, y) < MostExponent)) return;
        HelmholtzSums alone = default;
        term.Add(x, y, ref alone);
        (gx, gxx) = (gx + alone.gx, gxx + alone.gxx);
    }

    private double Exponent(double x, double y) => (C * (x - 1) * (x - 1)) + (D * (y - 1) * (y - 1));

    private void Add(double x, double y, ref HelmholtzSums sum)
    {
        double X = x - 1, Y = y - 1, z = X * X;

        // z over itself is never formed: every power that is left has a positive exponent.
        double root = z == 0 ? 0 : Math.Pow(z, power), bulk = z == 0 ? 0 : Math.Pow(z, a);
        double theta = (A * root) - Y, delta = Math.Max((theta * theta) + (B * bulk), LeastDelta);

        // By x: X Delta_x and X^2 Delta_xx.
        double thetaX = 2 * power * A * root, thetaXX = 2 * power * ((2 * power) - 1) * A * root;
        double deltaX = (2 * theta * thetaX) + (2 * a * B * bulk);
        double deltaXX = (2 * thetaX * thetaX) + (2 * theta * thetaXX) + (2 * a * ((2 * a) - 1) * B * bulk);
        double safe = z == 0 ? 1 : X;
        (deltaX, deltaXX, thetaX) = (deltaX / safe, deltaXX / (safe * safe), thetaX / safe);

        double q = Math.Pow(delta, b), q1 = b * q / delta, q2 = (b - 1) * q1 / delta;
        double qX = q1 * deltaX, qXX = (q1 * deltaXX) + (q2 * deltaX * deltaX);
        double qY = -2 * theta * q1, qYY = (2 * q1) + (4 * theta * theta * q2);
        double qXY = (-2 * thetaX * q1) - (2 * theta * q2 * deltaX);

        double psi = Math.Exp(-(C * z) - (D * Y * Y)), pX = -2 * C * X, pY = -2 * D * Y;
        double pXX = (pX * pX) - (2 * C), pYY = (pY * pY) - (2 * D);
        double f = n * psi * x;
        sum = new HelmholtzSums(
            sum.g + (f * q),
            sum.gx + (f * (q + (x * (qX + (q * pX))))),
            sum.gxx + (f * x * ((2 * (qX + (q * pX))) + (x * (qXX + (2 * qX * pX) + (q * pXX))))),
            sum.gy + (f * y * (qY + (q * pY))),
            sum.gyy + (f * y * y * (qYY + (2 * qY * pY) + (q * pYY))),
            sum.gxy + (f * y * (qY + (q * pY) + (x * (qXY + (qX * pY) + (pX * (qY + (q * pY))))))));
    }
}
