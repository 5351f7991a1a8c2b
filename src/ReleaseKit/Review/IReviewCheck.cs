namespace ReleaseKit.Review;

/// <summary>One check: reads the release and reports what it finds, nothing else. One file a check, listed in <see cref="Checks"/>.</summary>
public interface IReviewCheck
{
    IEnumerable<Finding> Check(ReviewSubject subject);
}
