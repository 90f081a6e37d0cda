using System.Net;

namespace WaterMix.Web.Hosting;

/// <summary>The names and addresses by which a machine calls itself.</summary>
internal static class LoopbackNames
{
    /// <summary>True for <c>localhost</c>, names under it (RFC 6761, section 6.3), and loopback addresses.</summary>
    /// <param name="host">A host without its port; an IPv6 address with or without brackets.</param>
    public static bool Contains(string host)
    {
        string name = host.TrimStart('[').TrimEnd(']').TrimEnd('.');
        return name.Equals("localhost", StringComparison.OrdinalIgnoreCase)
            || name.EndsWith(".localhost", StringComparison.OrdinalIgnoreCase)
            || (IPAddress.TryParse(name, out IPAddress? address) && IPAddress.IsLoopback(address));
    }
}
