namespace ReleaseKit.Wording;

/// <summary>A number in letters while its words come in: those below the next scale, and what is complete.</summary>
internal struct WordSum
{
    private const decimal Hundred = 100;
    private const decimal Most = 1e15m;

    private decimal complete;
    private decimal open;
    private decimal lastScale;
    private decimal lastNumber;
    private bool hasNumber;

    /// <summary>The number, if one has come in.</summary>
    public readonly IEnumerable<decimal> Numbers => hasNumber ? [complete + open] : [];

    /// <summary>Adds a word for a number; false if it cannot follow, so that it begins a number of its own.</summary>
    public bool Plus(decimal value, bool afterAnd)
    {
        var isFirst = !hasNumber;
        var isUnitOfTens = !afterAnd && lastNumber >= 20 && value is > 0 and < 10;
        var isBelowScale = lastNumber == 0 && lastScale > value && value > 0;
        if (!isFirst && !isUnitOfTens && !isBelowScale)
            return false;
        (open, lastNumber, hasNumber) = (open + value, value, true);
        return true;
    }

    /// <summary>Multiplies by a word of scale; false if there is nothing to multiply ("several hundred"), or too much.</summary>
    public bool Times(decimal scale)
    {
        if (!hasNumber || (complete + open) * scale > Most)
            return false;
        if (scale <= Hundred)
            open *= scale;
        else
            (complete, open) = open == 0 ? (complete * scale, 0) : (complete + (open * scale), 0);
        (lastScale, lastNumber) = (scale, 0);
        return true;
    }
}
