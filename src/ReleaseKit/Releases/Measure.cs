namespace ReleaseKit.Releases;

public enum MeasureKind { Count, Estimate, Amount, Share, Rate, Mean, Median, Index }

/// <summary>One column of figures of a table.</summary>
public sealed record Measure
{
    public required string Column { get; init; }

    /// <summary>Slug of the column, first part of every figure id.</summary>
    public required string Slug { get; init; }
    public required ReaderText Title { get; init; }
    public required Unit Unit { get; init; }
    public required MeasureKind Kind { get; init; }

    /// <summary>For a rate: per how many.</summary>
    public double? Per { get; init; }

    /// <summary>True if a share stands in the CSV as 0 to 1 ("in": "ones").</summary>
    public bool InOnes { get; init; }

    /// <summary>Pages print shares of one in 100.</summary>
    public int PrintFactor => InOnes ? 100 : 1;

    /// <summary>For a share or rate, what its numerator is multiplied by: 100, 1 or <see cref="Per"/>; null where that is not said.</summary>
    public double? Whole => Kind == MeasureKind.Share ? (InOnes ? 1 : 100) : Per;

    /// <summary>Factor from the CSV's number to the figure's unit; 1 unless the CSV counts in thousands. ValueAt gives the CSV's number.</summary>
    public double Multiplier { get; init; } = 1;

    /// <summary>Digits after the point of exact and public figures and the finest unit in print; null if not given.</summary>
    public int? Decimals { get; init; }

    /// <summary>Public bounds of the possible, after the kind's own (count ≥ 0, estimate ≥ 0, share 0 to 100 or 0 to 1); null is unbounded.</summary>
    public double? Lowest { get; init; }
    public double? Highest { get; init; }
    public bool Shown { get; init; } = true;

    /// <summary>The rules that say where each row's error comes from; the first that fits decides.</summary>
    public required IReadOnlyList<NoiseRule> Rules { get; init; }

    /// <summary>For each row, the index into Rules.</summary>
    public required byte[] RuleOf { get; init; }

    /// <summary>For each row, the unscaled value; its decimals in DecimalsOf. Meaningless where Status says there is no number.</summary>
    public required long[] Unscaled { get; init; }
    public required byte[] DecimalsOf { get; init; }

    /// <summary>For each row, the SDMX CL_OBS_STATUS letter; 'A' is a normal figure. See <see cref="HasNumber"/>.</summary>
    public required byte[] Status { get; init; }

    /// <summary>For each row, the value before the after-steps (unadjustedColumn), if the CSV carries one.</summary>
    public PublishedValue?[]? Unadjusted { get; init; }

    /// <summary>publishedWhen.atLeast, if given.</summary>
    public double? PublishedFrom { get; init; }

    public PublishedValue ValueAt(int row) => new(Unscaled[row], DecimalsOf[row]);
    public NoiseRule RuleAt(int row) => Rules[RuleOf[row]];
    public char StatusAt(int row) => (char)Status[row];

    /// <summary>Whether a row has a number: false for hidden (Q), missing (O), cannot exist (M), not collected (L).</summary>
    public bool HasNumber(int row) => Status[row] is not ((byte)'Q' or (byte)'O' or (byte)'M' or (byte)'L');
}

/// <summary>Where the error of a figure comes from.</summary>
public abstract record NoiseRule
{
    private NoiseRule()
    {
    }

    /// <summary>Noise of one mechanism of its own.</summary>
    public sealed record FromMechanism(Mechanism Mechanism) : NoiseRule;

    /// <summary>The published value is the sum of its parts' published values over this stub column: same draws.</summary>
    public sealed record SumOver(int StubColumn) : NoiseRule;

    /// <summary>From the confidential records without noise: outside the guarantee.</summary>
    public sealed record Exact(ReaderText Reason) : NoiseRule
    {
        /// <summary>Where release.json says so.</summary>
        public Review.Place At { get; init; } = new("release.json");
    }

    /// <summary>Known from elsewhere, not from the records.</summary>
    public sealed record Public(ReaderText Source) : NoiseRule;

    /// <summary>No rule fits the row. Stands only beside a stop that says so, or on rows without a number.</summary>
    public sealed record NotGiven : NoiseRule
    {
        public static NotGiven Instance { get; } = new();
    }
}
