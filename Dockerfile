# WaterMix in a container. Build:   docker build -t watermix .
# Run, for this machine's browser:  docker run --rm -p 127.0.0.1:5080:5080 -v watermix-data:/data watermix
# Inside, the app listens on every network of the container and warns, because it has no login: publish the port on 127.0.0.1 only.

FROM mcr.microsoft.com/dotnet/sdk:10.0 AS build
WORKDIR /source
COPY . .
RUN dotnet publish src/WaterMix.Web --configuration Release --output /app --artifacts-path /tmp/artifacts -p:UseAppHost=false

FROM mcr.microsoft.com/dotnet/aspnet:10.0
RUN apt-get update && apt-get install --yes --no-install-recommends curl && rm -rf /var/lib/apt/lists/*
WORKDIR /app
COPY --from=build /app .
COPY LICENSE NOTICE ./
RUN mkdir /data && chown $APP_UID /data
USER $APP_UID
VOLUME /data
ENV WATERMIX_DATA=/data \
    WATERMIX_ANY_ADDRESS=true \
    ASPNETCORE_HTTP_PORTS= \
    ASPNETCORE_URLS=http://+:5080
EXPOSE 5080
HEALTHCHECK --interval=30s --timeout=5s --start-period=20s CMD curl --fail --silent http://localhost:5080/health || exit 1
ENTRYPOINT ["dotnet", "WaterMix.Web.dll"]
