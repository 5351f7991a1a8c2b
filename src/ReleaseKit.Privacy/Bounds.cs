namespace ReleaseKit.Privacy;

/// <summary>An upper and a lower bound of one loss. Totals use the upper one; the lower one comes from a named pair of neighbouring data.</summary>
/// <typeparam name="T">The quantity: <see cref="Epsilon"/>, <see cref="Delta"/> or <see cref="Rho"/>.</typeparam>
/// <param name="Lower">No smaller loss can be claimed.</param>
/// <param name="Upper">The loss is proven to be no larger.</param>
public readonly record struct Bounds<T>(T Lower, T Upper)
    where T : struct;
