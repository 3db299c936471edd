using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Independent jobs on several threads; results in the order of the jobs, so they do not depend on the threads.</summary>
internal static class Parallelism
{
    /// <summary>Runs every job and returns the results in order; the first exception of the earliest job is thrown as it is.</summary>
    public static TResult[] Map<TJob, TResult>(
        IReadOnlyList<TJob> jobs, int threads, IProgress<double>? progress, CancellationToken cancellation, Func<TJob, TResult> run)
    {
        var results = new TResult[jobs.Count];
        int done = 0;
        void One(int index)
        {
            cancellation.ThrowIfCancellationRequested();
            results[index] = run(jobs[index]);
            progress?.Report((double)Interlocked.Increment(ref done) / jobs.Count);
        }

        if (threads <= 1 || jobs.Count <= 1)
        {
            for (int i = 0; i < jobs.Count; i++)
            {
                One(i);
            }

            return results;
        }

        var failures = new Exception?[jobs.Count];
        Parallel.For(0, jobs.Count, new ParallelOptions { MaxDegreeOfParallelism = threads }, index =>
        {
            try
            {
                One(index);
            }
            catch (Exception exception) when (exception is ComputationException or CaseException or OperationCanceledException)
            {
                failures[index] = exception; // rethrown below, the earliest first, as a single thread would
            }
        });
        if (Array.Find(failures, f => f is not null) is { } failure)
        {
            System.Runtime.ExceptionServices.ExceptionDispatchInfo.Throw(failure);
        }

        return results;
    }
}
