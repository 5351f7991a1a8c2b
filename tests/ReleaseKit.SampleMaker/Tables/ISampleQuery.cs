namespace ReleaseKit.SampleMaker.Tables;

/// <summary>A table asked of the households once: it holds the values before noise, and noises them as often as asked.</summary>
public interface ISampleQuery
{
    SampleTable Noised(Noiser noise);
}
