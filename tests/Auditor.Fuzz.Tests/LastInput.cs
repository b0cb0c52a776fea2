using System.IO.MemoryMappedFiles;

namespace Auditor.Fuzz.Tests;

/// <summary>Keeps the input at work in a file, so that it outlives the process when an input ends that.</summary>
internal sealed class LastInput : IDisposable
{
    private readonly MemoryMappedFile _file;
    private readonly MemoryMappedViewAccessor _view;

    public LastInput(string path)
    {
        _file = MemoryMappedFile.CreateFromFile(path, FileMode.Create, null, sizeof(int) + Mutator.MostBytes);
        _view = _file.CreateViewAccessor();
    }

    /// <summary>Keeps an input: its length in four bytes, then its bytes.</summary>
    public void Keep(byte[] input)
    {
        _view.Write(0, input.Length);
        _view.WriteArray(sizeof(int), input, 0, input.Length);
    }

    public void Dispose()
    {
        _view.Dispose();
        _file.Dispose();
    }
}
