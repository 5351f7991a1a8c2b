using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>A published figure with its error worked out: what every page, chart, download and sentence is made from.</summary>
public sealed record AppraisedFigure
{
    // Above its nominal value by more than this, a coverage is said to be "at least" so large.
    private const double CoverageSlack = 1e-9;

    public required FigureRef Ref { get; init; }
    public required Table Table { get; init; }
    public required Measure Measure { get; init; }
    public int Row => Ref.Row;

    /// <summary>Canonical address: "arrears/in_arrears?district=Aldermoor&amp;ward=All", all stub columns named in stub order.</summary>
    public required string Address { get; init; }

    /// <summary>Stable id in its page: MEASURE.VALUE.VALUE of slugs.</summary>
    public required string Id { get; init; }

    /// <summary>The exact published value in the figure's unit (after a multiplier; shares as the CSV has them); meaningless if HasNumber is false.</summary>
    public required PublishedValue Value { get; init; }

    /// <summary>The value as it stands on pages: to the unit of its main margin, or to the measure's decimals where there is none. Shares in 100.</summary>
    public required PublishedValue Printed { get; init; }

    /// <summary>Whether the file holds more digits than stand on pages; said as "about".</summary>
    public bool IsRoundedForPrint => Value.ToDecimal() * Measure.PrintFactor != Printed.ToDecimal();

    /// <summary>SDMX CL_OBS_STATUS letter.</summary>
    public required char Status { get; init; }
    public required bool HasNumber { get; init; }

    /// <summary>The law of its error; null for exact, public, not stated and no number. Shared by all figures alike.</summary>
    public FigureError? Error { get; init; }

    /// <summary>The mechanism whose noise it carries (for a sum of parts, the parts' if they share one), or null.</summary>
    public Mechanism? Mechanism { get; init; }

    /// <summary>For a sum of parts published as such: how many draws it holds; 1 for a draw of its own.</summary>
    public int Draws { get; init; } = 1;

    /// <summary>For a sum of parts published as such: how many parts there are, how many of them are hidden but in it, and how many not published and not in it.</summary>
    public int Parts { get; init; }
    public int PartsHidden { get; init; }
    public int PartsLeftOut { get; init; }

    /// <summary>Ranges at the lower, main and upper coverage, in that order, as far as they are known; empty where there is no margin.</summary>
    public required IReadOnlyList<FigureRange> Ranges { get; init; }
    public FigureRange? Main => Ranges.Count < 2 ? null : Ranges[1];

    /// <summary>What the coverage of its ranges is a promise about.</summary>
    public RangePromise Promise => Error is null ? RangePromise.Every : RangePromises.Of(Error, Value.Unscaled == 0);

    /// <summary>Whether words say "at least" of a range: it attains more than its nominal coverage, its margin is an upper bound, or a threshold decides.</summary>
    public bool HoldsAtLeast(FigureRange range) =>
        range.Attained > range.Coverage.Share + CoverageSlack || Error is { MarginIsUpperBound: true } or { DependsOnPublished: true };

    public required Reliability Reliability { get; init; }

    /// <summary>Main margin ÷ figure, rounded up at the 12th digit; null where there is no margin or the figure is not above 0 though it cannot be negative.</summary>
    public double? MarginToFigure { get; init; }

    /// <summary>What the value before noise can be, in the unit of Ranges.</summary>
    public required PossibleValues Possible { get; init; }

    /// <summary>The chance that noise leaves the value as it was, where that is the usual case (a margin of zero, raised to one grid step).</summary>
    public double? LeftAsItWas { get; init; }

    /// <summary>For a weak figure: the published figure of the next larger whole that is not weak, or null.</summary>
    public FigureRef? UseInstead { get; init; }

    /// <summary>What is special about it: decides part 3 of the reading and the marks.</summary>
    public required FigureCase Case { get; init; }
}

/// <summary>The range at one coverage: margins and ends unrounded for files, and as printed on pages.</summary>
public sealed record FigureRange
{
    public required Coverage Coverage { get; init; }

    /// <summary>Published − uncut low, and uncut high − published; equal unless the range is uneven. Under a threshold the cut ends count.</summary>
    public required double MarginDown { get; init; }
    public required double MarginUp { get; init; }
    public double Margin => Math.Max(MarginDown, MarginUp);
    public required double Low { get; init; }
    public required double High { get; init; }
    public required double UncutLow { get; init; }
    public required double UncutHigh { get; init; }

    /// <summary>Attained coverage, a lower bound.</summary>
    public required double Attained { get; init; }
    public required PrintedRange Printed { get; init; }
}

/// <summary>
/// The digits that stand on pages, shares in 100: the value and its margin(s) to one unit, the ends outward. An end that is not cut is value ∓ margin,
/// digit for digit; a cut one stands at what is possible, or further out where the half-width does not reach what is possible.
/// </summary>
public sealed record PrintedRange(PublishedValue Value, PublishedValue MarginDown, PublishedValue MarginUp, PublishedValue Low, PublishedValue High, bool LowIsCut, bool HighIsCut)
{
    public bool IsUneven => MarginDown != MarginUp;

    /// <summary>The larger side: the margin of the light-digits rule.</summary>
    public PublishedValue Margin => MarginDown.Unscaled > MarginUp.Unscaled ? MarginDown : MarginUp;
}

/// <summary>The first special case that fits a figure, in the order of the readings.</summary>
public enum SpecialCase
{
    None,
    NoNumber,
    Exact,
    Public,
    NoMargin,
    BelowZero,
    AboveHighest,
    Zero,
    FromThreshold,
    NotPublishedBelow,
    FlooredSum,
    MostlyUnchanged,
    Capped,
    MarginAsLargeAsFigure,
}

/// <summary>
/// The first special case, and everything else that applies: rounded on purpose, published as the bound of a floor or ceiling,
/// amounts capped, near a threshold of publication.
/// </summary>
public sealed record FigureCase(SpecialCase First, bool Rounded, bool Floored, bool Capped, bool Threshold);
